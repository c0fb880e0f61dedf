import { afterAll, expect, it } from 'vitest';
import { buildNetlist } from '@/lib/netlist/connectivity/build-netlist';
import { buildEngineDeck } from '@/lib/netlist/engine-deck/build-engine-deck';
import type { Netlist } from '@/lib/netlist/netlist';
import { SeededRandom } from '@/lib/netlist/testing/seeded-random';
import { randomSheet } from '@/lib/netlist/testing/random-sheet';
import type { FailureStatus } from '@/lib/spice/engine';
import { createNodeEngine } from '@/lib/spice/node-engine';
import { lineFault } from '@/lib/spice/protocol/deck-text';

const engine = createNodeEngine();
afterAll(() => engine.dispose());

/** What a circuit without electrical sense may end in. The others would be a fault of the deck's generator. */
const sensible: readonly (FailureStatus | 'ok')[] = ['ok', 'singular', 'no-convergence', 'timestep', 'aborted', 'non-finite'];

/** Enough facts for a model of every part, and the net with the most pins for 0 V. */
function grounded(netlist: Netlist): Netlist {
  const [busiest] = [...netlist.nets].sort((a, b) => b.pins.length - a.pins.length);
  const rename = (net: string): string => (net === busiest?.name ? '0' : net === '0' ? 'N0' : net);
  return {
    ...netlist,
    nets: netlist.nets.map((net) => ({ ...net, name: rename(net.name) })),
    parts: netlist.parts.map((part) => ({
      ...part,
      facts: { value: 1, vz: 12, vth_typ: 2, rds_on: 1, hfe_min: 100, ...part.facts },
      pins: Object.fromEntries(Object.entries(part.pins).map(([pin, net]) => [pin, rename(net)])),
    })),
  };
}

it('whatever is drawn, the deck passes the guard and the engine can read it', async () => {
  const endings = new Map<string, number>();
  for (let seed = 1; seed <= 200; seed += 1) {
    const deck = buildEngineDeck(grounded(buildNetlist(randomSheet(4 + (seed % 12), new SeededRandom(seed)))), { settings: {}, corner: 'typ' });
    const empty = !('code' in deck) && deck.request.vectors.length === 0;
    const ending = 'code' in deck ? deck.code : empty ? 'ok' : (await engine.simulate(deck.request)).status;
    if (!('code' in deck)) {
      expect(deck.request.lines.map(lineFault).filter((fault) => fault !== null), `seed ${seed}`).toEqual([]);
      expect(sensible, `seed ${seed}: ${deck.request.lines.join('\n')}`).toContain(ending);
    }
    endings.set(ending, (endings.get(ending) ?? 0) + 1);
  }
  expect(endings.get('ok'), JSON.stringify([...endings])).toBeGreaterThan(60);
}, 120_000);
