import * as Y from 'yjs';
import { codecs } from '../codecs/codec-table';
import { collectionNames, collectionOf, type CollectionName, type FlatRecord } from '../stored-sheet';
import { recordBytesLimit } from './sheet-limits';

export interface RecordName {
  readonly collection: CollectionName;
  readonly id: string;
}

/** Records that a transaction added or changed, each once; records it deleted are left out. */
export function changedRecordsOf(doc: Y.Doc, transaction: Y.Transaction): readonly RecordName[] {
  const found = new Map<string, RecordName>();
  for (const collection of collectionNames) {
    const stored = collectionOf(doc, collection);
    const add = (id: string) => stored.has(id) && found.set(`${collection} ${id}`, { collection, id });
    for (const [type, keys] of transaction.changed) {
      if ((type as unknown) === stored) keys.forEach((key) => key !== null && add(key));
      else if ((type.parent as unknown) === stored && type._item?.parentSub) add(type._item.parentSub);
    }
  }
  return [...found.values()];
}

/** What is wrong with one stored record; null when it is sound. */
export function problemOfRecord(
  doc: Y.Doc, collection: CollectionName, id: string,
): { readonly reason: 'schema' | 'size'; readonly words: string } | null {
  const stored = collectionOf(doc, collection).get(id) as unknown;
  if (!(stored instanceof Y.Map)) return { reason: 'schema', words: 'is no record' };
  for (const value of stored.values()) {
    if (value instanceof Y.AbstractType) return { reason: 'schema', words: 'holds a shared type where a plain value belongs' };
  }
  const flat = stored.toJSON() as FlatRecord;
  if (JSON.stringify(flat).length > recordBytesLimit) return { reason: 'size', words: 'is larger than 64 KiB' };
  const decoded = codecs[collection].fromFlat(id, flat);
  return decoded.ok ? null : { reason: 'schema', words: decoded.reason };
}
