import { describe, expect, it } from 'vitest';
import * as Y from 'yjs';
import { readSheet } from '@/lib/document/read-sheet';
import { gateStage } from '@/lib/document/testing/gate-stage';
import { randomStep, seeded } from './testing/seeded-fuzz';
import { TestEditor } from './testing/test-editor';

const seeds = Array.from({ length: 20 }, (_, index) => index + 1);

/** Two people on one sheet whose line is cut and mended: updates wait while it is cut. */
class Pair {
  readonly people: readonly TestEditor[];
  private readonly waiting: [Uint8Array[], Uint8Array[]] = [[], []];
  private open = true;

  constructor() {
    const first = new TestEditor(gateStage(), { idPrefix: 'a' });
    const second = new TestEditor(undefined, { idPrefix: 'b' });
    this.people = [first, second];
    Y.applyUpdate(second.doc, Y.encodeStateAsUpdate(first.doc), 'line');
    this.people.forEach((person, index) => person.doc.on('update', (update: Uint8Array, origin: unknown) => {
      if (origin === 'line') return;
      this.waiting[1 - index as 0 | 1].push(update);
      if (this.open) this.deliver();
    }));
  }

  cut(): void {
    this.open = false;
  }

  mend(): void {
    this.open = true;
    this.deliver();
  }

  private deliver(): void {
    this.people.forEach((person, index) => {
      for (const update of this.waiting[index as 0 | 1].splice(0)) Y.applyUpdate(person.doc, update, 'line');
    });
  }
}

describe('two people on one sheet', () => {
  it.each(seeds)('end with the same sheet, whatever they do while the line is cut: seed %i', (seed) => {
    const random = seeded(seed * 7_919);
    const pair = new Pair();
    for (let step = 0; step < 30; step += 1) {
      const chance = random();
      if (chance < 0.08) pair.cut();
      else if (chance < 0.16) pair.mend();
      randomStep(pair.people[random() < 0.5 ? 0 : 1] as TestEditor, random);
    }
    pair.mend();
    const [mine, theirs] = pair.people.map((person) => readSheet(person.doc).sheet);
    expect(mine).toEqual(theirs);
    pair.people.forEach((person) => expect(person.sheet).toEqual(mine));
  });

  it.each(seeds)('each undo only their own edits: seed %i', (seed) => {
    const random = seeded(seed * 104_729);
    const pair = new Pair();
    const [mine, theirs] = pair.people as [TestEditor, TestEditor];
    theirs.place('fuse', 1_200, 1_200).place('zener', 1_400, 1_200);
    const made = theirs.sheet.parts.filter((part) => part.x >= 1_200 && part.y === 1_200).map((part) => part.id);
    for (let step = 0; step < 12; step += 1) {
      mine.place('resistor', Math.floor(random() * 40) * 10, 900).press(random() < 0.5 ? '.' : 'ArrowLeft');
    }
    mine.undoAll();
    expect(mine.sheet.parts.map((part) => part.id)).toEqual(expect.arrayContaining(made));
    expect(mine.sheet.parts).toHaveLength(gateStage().parts.length + 2);
  });
});
