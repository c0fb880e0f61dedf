import type { Netlist } from '../netlist';
import type { OperatingPoint, Refusal } from '../points/point';
import { buildEngineDeck, type DeckOptions } from './build-engine-deck';
import type { PointEngine } from './engine-port';
import { allowedDrift } from './gate-leakage';
import { engineRefusal } from './refusal-words';

export type PointRun =
  | { readonly status: 'ok'; readonly op: OperatingPoint; readonly assumed: readonly { readonly part: string; readonly fact: string; readonly words: string }[] }
  | { readonly status: 'refused'; readonly refusal: Refusal };

/**
 * One operating point. Where a gate or base reaches 0 V through junctions or channels only, it is run with leakage both
 * ways as well, and refused when the leakage alone moves that pin: then nothing drives it.
 */
export async function runPoint(engine: PointEngine, netlist: Netlist, options: DeckOptions): Promise<PointRun> {
  const deck = buildEngineDeck(netlist, options);
  if ('code' in deck) return { status: 'refused', refusal: deck };
  if (deck.request.vectors.length === 0) return { status: 'ok', op: deck.decode({}), assumed: deck.assumed };
  const answer = await engine.simulate(deck.request);
  if (!('values' in answer)) return { status: 'refused', refusal: engineRefusal(answer.status, answer.messages, deck.names) };

  if (deck.weakControls.length > 0 && options.gateLeakage === undefined) {
    const [up, down] = await Promise.all([
      runPoint(engine, netlist, { ...options, gateLeakage: 1 }),
      runPoint(engine, netlist, { ...options, gateLeakage: -1 }),
    ]);
    const undriven = deck.weakControls.filter(({ part, net }) => {
      if (up.status === 'refused' || down.status === 'refused') return true;
      const card = netlist.models.find(({ name }) => name.toLowerCase() === part.model?.toLowerCase());
      // A floating bridge may carry its gate along: what counts is the pin against the source or emitter.
      const reference = part.pins.S ?? part.pins.E ?? '0';
      const drive = ({ volts }: OperatingPoint) => (volts[net] ?? 0) - (volts[reference] ?? 0);
      return Math.abs(drive(up.op) - drive(down.op)) > allowedDrift(part, card);
    });
    if (undriven.length > 0) {
      const pins = undriven.map(({ part, pin }) => `${part.ref}:${pin}`);
      return {
        status: 'refused',
        refusal: {
          code: 'precheck',
          words: `${pins.join(', ')} moves with leakage alone: nothing drives it`,
          nodes: undriven.map(({ net }) => net),
          parts: undriven.map(({ part }) => part.ref),
        },
      };
    }
  }
  return { status: 'ok', op: deck.decode(answer.values), assumed: deck.assumed };
}
