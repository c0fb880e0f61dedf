import * as Y from 'yjs';
import type { Sheet } from './records';
import { readSheet, type ReadSheet } from './read-sheet';
import { sharedTypesOf } from './stored-sheet';
import { emptySheet, writeSheet } from './write-sheet';

/** A document from its stored bytes, one update or several. Throws when bytes are no Yjs update. */
export function decodeDocument(updates: readonly Uint8Array[]): Y.Doc {
  const doc = new Y.Doc();
  sharedTypesOf(doc);
  doc.transact(() => updates.forEach((update) => Y.applyUpdate(doc, update)));
  return doc;
}

export const encodeDocument = (doc: Y.Doc): Uint8Array => Y.encodeStateAsUpdate(doc);

/** A new document that holds `sheet`, as one update. */
export function encodeSheet(sheet: Sheet): Uint8Array {
  const doc = new Y.Doc();
  writeSheet(doc, emptySheet, sheet);
  return encodeDocument(doc);
}

export const decodeSheet = (bytes: Uint8Array): ReadSheet => readSheet(decodeDocument([bytes]));

/** The update that turns the document's sheet into `after`, the document itself unchanged; null when nothing differs. */
export function updateTowards(bytes: Uint8Array, change: (sheet: Sheet) => Sheet): Uint8Array | null {
  const doc = decodeDocument([bytes]);
  const before = readSheet(doc).sheet;
  const after = change(before);
  if (after === before) return null;
  const since = Y.encodeStateVector(doc);
  writeSheet(doc, before, after);
  return Y.encodeStateAsUpdate(doc, since);
}
