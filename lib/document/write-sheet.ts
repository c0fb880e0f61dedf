import type * as Y from 'yjs';
import { codecs } from './codecs/codec-table';
import type { Sheet } from './records';
import { collectionNames, collectionOf, libraryOf, metaOf, recordMapOf, schemaVersion, type CollectionName, type FlatRecord, type FlatValue } from './stored-sheet';

/** Sheet of a circuit that nobody has drawn on yet. */
export const emptySheet: Sheet = {
  title: '', parts: [], wires: [], junctions: [], scenarios: [], holdPoints: [], models: [], subcircuits: [],
};

/**
 * Writes the difference between two sheets in one transaction, property by property: what `after` leaves
 * alone is not written, so that other people's changes to it stay. `before` is what the document reads as now.
 */
export function writeSheet(doc: Y.Doc, before: Sheet, after: Sheet, origin?: unknown): void {
  doc.transact(() => {
    if (metaOf(doc).get('schema') !== schemaVersion) metaOf(doc).set('schema', schemaVersion);
    if (before.title !== after.title) metaOf(doc).set('title', after.title);
    for (const name of collectionNames) writeCollection(doc, name, before[name], after[name]);
    writeKeys(libraryOf(doc), libraryRecord(before), libraryRecord(after));
  }, origin);
}

interface Identified { readonly id: string }

function writeCollection(doc: Y.Doc, name: CollectionName, before: readonly Identified[], after: readonly Identified[]): void {
  if (before === after) return;
  const stored = collectionOf(doc, name);
  const toFlat = codecs[name].toFlat as (record: Identified) => FlatRecord;
  const old = new Map(before.map((record) => [record.id, record]));
  for (const record of after) {
    const was = old.get(record.id);
    old.delete(record.id);
    if (was === record) continue;
    const map = stored.get(record.id);
    if (was && map) writeKeys(map, toFlat(was), toFlat(record));
    else stored.set(record.id, recordMapOf(toFlat(record)));
  }
  for (const id of old.keys()) stored.delete(id);
}

function writeKeys(map: Y.Map<FlatValue>, before: FlatRecord, after: FlatRecord): void {
  for (const [key, value] of Object.entries(after)) {
    if (!sameValue(before[key], value)) map.set(key, value);
  }
  for (const key of Object.keys(before)) {
    if (!(key in after)) map.delete(key);
  }
}

function libraryRecord(sheet: Sheet): FlatRecord {
  return Object.fromEntries([
    ...sheet.models.map((model) => [`model:${model.name}`, model]),
    ...sheet.subcircuits.map((subcircuit) => [`subcircuit:${subcircuit.name}`, subcircuit]),
  ]) as FlatRecord;
}

/** Equality of plain values, order of keys included (both sides come from the same codec). */
function sameValue(a: FlatValue | undefined, b: FlatValue | undefined): boolean {
  return a === b || (typeof a === 'object' && typeof b === 'object' && JSON.stringify(a) === JSON.stringify(b));
}
