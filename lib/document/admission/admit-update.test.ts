import { describe, expect, it } from 'vitest';
import * as Y from 'yjs';
import { decodeDocument, encodeDocument, encodeSheet } from '../encode-sheet';
import { collectionOf, recordMapOf } from '../stored-sheet';
import { gateStage } from '../testing/gate-stage';
import { admitUpdate } from './admit-update';
import { updateBytesLimit } from './sheet-limits';

const committed = encodeSheet(gateStage());
const candidate = () => decodeDocument([committed]);

/** The update that a client with the committed document sends for a change. */
function edit(change: (doc: Y.Doc) => void): Uint8Array {
  const doc = candidate();
  const since = Y.encodeStateVector(doc);
  doc.transact(() => change(doc));
  return Y.encodeStateAsUpdate(doc, since);
}

const refusal = (update: Uint8Array) => {
  const answer = admitUpdate(candidate(), update);
  return answer.ok ? 'taken' : answer.reason;
};

describe('admission of one update', () => {
  it('takes a sound edit and says whether anything changed', () => {
    const update = edit((doc) => collectionOf(doc, 'parts').get('R1')?.set('fact:value', 33_000));
    const doc = candidate();
    expect(admitUpdate(doc, update)).toEqual({ ok: true, changed: true });
    expect(admitUpdate(doc, update)).toEqual({ ok: true, changed: false });
  });

  it.each([
    ['a place off the grid', (doc: Y.Doc) => collectionOf(doc, 'parts').get('R1')?.set('x', 3)],
    ['a kind that does not exist', (doc: Y.Doc) => collectionOf(doc, 'parts').get('R1')?.set('kind', 'flux')],
    ['a missing key', (doc: Y.Doc) => collectionOf(doc, 'parts').get('R1')?.delete('kind')],
    ['a record that is no map', (doc: Y.Doc) => collectionOf(doc, 'parts').set('X', 7 as never)],
    ['a shared type inside a record', (doc: Y.Doc) => collectionOf(doc, 'parts').get('R1')?.set('note', new Y.Map() as never)],
    ['a shared type that no sheet has', (doc: Y.Doc) => doc.getArray('elsewhere').push([1])],
    ['another layout', (doc: Y.Doc) => doc.getMap('meta').set('schema', 2)],
    ['a title of two lines is no text', (doc: Y.Doc) => doc.getMap('meta').set('title', 5)],
    ['a model that is none', (doc: Y.Doc) => doc.getMap('library').set('model:X', { name: 'X' })],
  ])('refuses %s', (_, change) => {
    expect(refusal(edit(change))).toBe('schema');
  });

  it('refuses bytes that are no update, whole or cut', () => {
    expect(refusal(new Uint8Array([9, 9, 9, 9]))).toBe('undecodable');
    const update = edit((doc) => collectionOf(doc, 'parts').get('R1')?.set('fact:part', 'a longer text to cut'));
    expect(refusal(update.slice(0, update.length - 6))).not.toBe('taken');
  });

  it('refuses an edit that rests on one it has not seen', () => {
    const doc = candidate();
    collectionOf(doc, 'parts').get('R1')?.set('fact:value', 1);
    const since = Y.encodeStateVector(doc);
    collectionOf(doc, 'parts').get('R1')?.set('fact:value', 2);
    expect(refusal(Y.encodeStateAsUpdate(doc, since))).toBe('gap');
  });

  it('refuses too large an edit, too large a record and too many records', () => {
    expect(refusal(new Uint8Array(updateBytesLimit + 1))).toBe('size');
    expect(refusal(edit((doc) => collectionOf(doc, 'parts').get('R1')?.set('fact:note', 'x'.repeat(70_000))))).toBe('size');
    expect(refusal(edit((doc) => {
      for (let index = 0; index < 70; index += 1) {
        collectionOf(doc, 'scenarios').set(`s${index}`, recordMapOf({ name: `${index}`, ambient: 25 }));
      }
    }))).toBe('size');
  });

  it('takes the whole document as one update of an empty one', () => {
    expect(admitUpdate(new Y.Doc(), encodeDocument(candidate()))).toEqual({ ok: true, changed: true });
  });
});
