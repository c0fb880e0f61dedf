import { describe, expect, it } from 'vitest';
import { endKey } from '@/lib/document/geometry/sheet-index';
import { gateStage } from '@/lib/document/testing/gate-stage';
import { randomStep, seeded } from './testing/seeded-fuzz';
import { TestEditor } from './testing/test-editor';

const seeds = Array.from({ length: 60 }, (_, index) => index + 1);

describe('whatever a person does', () => {
  it.each(seeds)('leaves a sound sheet, and undo leads all the way back: seed %i', (seed) => {
    const random = seeded(seed);
    const test = new TestEditor(gateStage());
    const before = test.hashes;
    const done: string[] = [];
    for (let step = 0; step < 40; step += 1) {
      done.push(randomStep(test, random));
      try {
        test.expectSound();
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
