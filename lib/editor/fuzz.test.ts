import { describe, expect, it } from 'vitest';
import { endKey } from '@/lib/document/geometry/sheet-index';
import { sheetToNetlist } from '@/lib/document/nets/sheet-to-netlist';
import { gateStage } from '@/lib/document/testing/gate-stage';
import type { Netlist } from '@/lib/netlist/netlist';
import { randomStep, seeded } from './testing/seeded-fuzz';
import { TestEditor } from './testing/test-editor';

/** Steps that may join nets and never part them. (Placing and moving may set a part in line with a wire.) */
const joining = new Set(['wire', 'nudge', 'pose', 'line', 'join', 'open']);

/** Pins that were one net before and are not so now. */
function partedPins(before: Netlist, after: Netlist): readonly string[] {
  const netOf = new Map(after.nets.flatMap((net) => net.pins.map((pin) => [pin, net.name])));
  return before.nets.filter((net) => new Set(net.pins.map((pin) => netOf.get(pin))).size > 1).flatMap((net) => net.pins);
}

const seeds = Array.from({ length: 60 }, (_, index) => index + 1);

describe('whatever a person does', () => {
  it.each(seeds)('leaves a sound sheet, and undo leads all the way back: seed %i', (seed) => {
    const random = seeded(seed);
    const test = new TestEditor(gateStage());
    const before = test.hashes;
    const done: string[] = [];
    for (let step = 0; step < 40; step += 1) {
      const netlist = sheetToNetlist(test.sheet);
      done.push(randomStep(test, random));
      try {
        test.expectSound();
        if (joining.has(done.at(-1) ?? '')) expect(partedPins(netlist, sheetToNetlist(test.sheet))).toEqual([]);
        const refs = test.sheet.parts.filter((part) => part.ref !== '' && part.kind !== 'plug-contact').map((part) => part.ref);
        expect(new Set(refs).size).toBe(refs.length);
        const ends = test.sheet.wires.flatMap((wire) => [endKey(wire.a), endKey(wire.b)]);
        for (const junction of test.sheet.junctions) expect(ends.filter((end) => end === `junction:${junction.id}`)).not.toHaveLength(2);
      } catch (error) {
        throw new Error(`Seed ${seed}, after ${done.join(', ')}`, { cause: error });
      }
    }
    expect(test.undoAll().hashes).toEqual(before);
  });
});
