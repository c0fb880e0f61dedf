import { describe, expect, it } from 'vitest';
import * as Y from 'yjs';
import { decodeDocument, decodeSheet, encodeDocument, encodeSheet } from './encode-sheet';
import { readSheet } from './read-sheet';
import { collectionOf, type FlatValue } from './stored-sheet';
import { gateStage } from './testing/gate-stage';
import { emptySheet, writeSheet } from './write-sheet';

const byId = <T extends { id: string }>(records: readonly T[]) => [...records].sort((a, b) => (a.id < b.id ? -1 : 1));

function docOfStage(): Y.Doc {
  return decodeDocument([encodeSheet(gateStage())]);
}

describe('a stored sheet', () => {
  it('reads back as it was written', () => {
    const stage = gateStage();
    const { sheet, repairs } = decodeSheet(encodeSheet(stage));
    expect(repairs).toEqual([]);
    expect(sheet).toEqual({ ...stage, parts: byId(stage.parts), wires: byId(stage.wires), junctions: byId(stage.junctions) });
  });

  it('reads an empty document as an empty sheet', () => {
    expect(readSheet(new Y.Doc())).toEqual({ sheet: emptySheet, repairs: [] });
  });

  it('keeps changes of two people to different properties of one part', () => {
    const mine = docOfStage();
    const theirs = decodeDocument([encodeDocument(mine)]);
    for (const [doc, change] of [[mine, { x: 240 }], [theirs, { facts: { value: 33_000, pmax: 0.25 } }]] as const) {
      const before = readSheet(doc).sheet;
      writeSheet(doc, before, { ...before, parts: before.parts.map((part) => (part.id === 'R1' ? { ...part, ...change } : part)) });
    }
    Y.applyUpdate(mine, encodeDocument(theirs));
    Y.applyUpdate(theirs, encodeDocument(mine));
    expect(readSheet(mine).sheet).toEqual(readSheet(theirs).sheet);
    expect(readSheet(mine).sheet.parts.find((part) => part.id === 'R1')).toMatchObject({ x: 240, facts: { value: 33_000 } });
  });

  it('leaves out a wire whose part somebody removed meanwhile, and the junction that it leaves alone', () => {
    const doc = docOfStage();
    for (const id of ['L1', 'D2', 'V1']) collectionOf(doc, 'parts').delete(id);
    const { sheet, repairs } = readSheet(doc);
    expect(sheet.wires.map((wire) => wire.id)).not.toContain('top L1:1');
    expect(sheet.junctions.map((junction) => junction.id)).toEqual(['gate', 'low']);
    expect(repairs).toContainEqual({ collection: 'wires', id: 'top L1:1', reason: 'an end is missing' });
    expect(sheet.scenarios[0]?.values).toEqual({});
    expect(sheet.holdPoints[0]).not.toHaveProperty('source');
  });

  it('ignores unknown keys and leaves out records that are none', () => {
    const doc = docOfStage();
    collectionOf(doc, 'parts').get('R1')?.set('colour-of-shadow', 'blue');
    collectionOf(doc, 'parts').get('R3')?.set('x', 'left' as FlatValue);
    collectionOf(doc, 'parts').set('X', 7 as never);
    const { sheet, repairs } = readSheet(doc);
    expect(sheet.parts.map((part) => part.id)).toContain('R1');
    expect(repairs.filter((repair) => repair.collection === 'parts').map((repair) => repair.id)).toEqual(['R3', 'X']);
  });

  it('gives the second of two hold points with one name a name of its own, the same on every replica', () => {
    const stage = gateStage();
    const doubled = { ...stage, holdPoints: [...stage.holdPoints, { id: 'h3', name: '15 V', volts: 18, amps: 1 }] };
    const first = decodeSheet(encodeSheet(doubled));
    expect(first.sheet.holdPoints.map((point) => point.name)).toEqual(['15 V', '15 V (2)', '36 V']);
    expect(decodeSheet(encodeSheet({ ...doubled, holdPoints: [...doubled.holdPoints].reverse() })).sheet).toEqual(first.sheet);
  });

  it('writes nothing where nothing differs', () => {
    const doc = docOfStage();
    const before = readSheet(doc).sheet;
    let updates = 0;
    doc.on('update', () => { updates += 1; });
    writeSheet(doc, before, { ...before, parts: before.parts.map((part) => ({ ...part })) });
    expect(updates).toBe(0);
  });
});
