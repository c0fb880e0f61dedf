import * as Y from 'yjs';
import { collectionNames, collectionOf } from '@/lib/document/stored-sheet';
import type { RefusedEdit } from './edit-store';

type Records = Readonly<Record<string, unknown>>;

function recordsOf(doc: Y.Doc): Readonly<Record<string, Records>> {
  return Object.fromEntries(collectionNames.map((name) => [name, collectionOf(doc, name).toJSON() as Records]));
}

/** What a refused edit would have changed on the sheet, as JSON: records it would have set, null for those it would have removed. */
export function refusedText(sheet: Y.Doc, edit: RefusedEdit): string {
  const doc = new Y.Doc();
  try {
    Y.applyUpdate(doc, Y.encodeStateAsUpdate(sheet));
    const before = recordsOf(doc);
    for (const update of edit.updates) Y.applyUpdate(doc, update);
    const after = recordsOf(doc);
    const changed = Object.fromEntries(collectionNames.map((name) => {
      const ids = new Set([...Object.keys(before[name] ?? {}), ...Object.keys(after[name] ?? {})]);
      const entries = [...ids].map((id) => [id, after[name]?.[id] ?? null] as const)
        .filter(([id, record]) => JSON.stringify(record) !== JSON.stringify(before[name]?.[id] ?? null));
      return [name, Object.fromEntries(entries)] as const;
    }).filter(([, records]) => Object.keys(records).length > 0));
    return JSON.stringify(changed, null, 2);
  } catch {
    return '';
  } finally {
    doc.destroy();
  }
}

/** True when the edit rests on nothing that is missing from the sheet. */
export function fits(sheet: Y.Doc, edit: RefusedEdit): boolean {
  const doc = new Y.Doc();
  try {
    Y.applyUpdate(doc, Y.encodeStateAsUpdate(sheet));
    for (const update of edit.updates) Y.applyUpdate(doc, update);
    return doc.store.pendingStructs === null && doc.store.pendingDs === null;
  } catch {
    return false;
  } finally {
    doc.destroy();
  }
}
