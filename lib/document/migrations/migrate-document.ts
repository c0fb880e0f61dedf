import type * as Y from 'yjs';
import { flatOf } from '../sheet-reader';
import {
  collectionNames, collectionOf, libraryOf, metaOf, recordMapOf, schemaVersion, type CollectionName, type FlatRecord, type FlatValue, type StoredSheet,
} from '../stored-sheet';
import { migrate } from './migrate';
import { migrations, type Migration } from './migration';

/** The document as plain stored data. */
export function storedSheetOf(doc: Y.Doc): StoredSheet {
  const collections = Object.fromEntries(collectionNames.map((name) => {
    const stored = collectionOf(doc, name);
    return [name, Object.fromEntries([...stored.keys()].sort().map((id) => [id, flatOf(stored.get(id))]))];
  })) as Record<CollectionName, Record<string, FlatRecord>>;
  return { collections, library: libraryOf(doc).toJSON() as FlatRecord, meta: metaOf(doc).toJSON() as FlatRecord };
}

/** Brings a document to layout `target` in one transaction; writes only what the steps changed. True when it changed. */
export function migrateDocument(
  doc: Y.Doc, target: number = schemaVersion, steps: readonly Migration[] = migrations, origin?: unknown,
): boolean {
  const before = storedSheetOf(doc);
  const after = migrate(before, target, steps);
  if (after === before) return false;
  doc.transact(() => {
    for (const name of collectionNames) writeRecords(collectionOf(doc, name), before.collections[name], after.collections[name]);
    writeFlat(libraryOf(doc), before.library, after.library);
    writeFlat(metaOf(doc), before.meta, after.meta);
  }, origin);
  return true;
}

function writeRecords(
  stored: ReturnType<typeof collectionOf>, before: Readonly<Record<string, FlatRecord>>, after: Readonly<Record<string, FlatRecord>>,
): void {
  for (const [id, flat] of Object.entries(after)) {
    const map = stored.get(id);
    if (map && before[id]) writeFlat(map, before[id], flat);
    else stored.set(id, recordMapOf(flat));
  }
  for (const id of Object.keys(before)) if (!(id in after)) stored.delete(id);
}

function writeFlat(map: Y.Map<FlatValue>, before: FlatRecord, after: FlatRecord): void {
  for (const [key, value] of Object.entries(after)) {
    if (JSON.stringify(before[key]) !== JSON.stringify(value)) map.set(key, value);
  }
  for (const key of Object.keys(before)) if (!(key in after)) map.delete(key);
}
