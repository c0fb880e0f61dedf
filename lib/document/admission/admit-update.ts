import * as Y from 'yjs';
import { readLibrary } from '../repair/repair-library';
import { collectionNames, collectionOf, libraryOf, metaOf, schemaVersion, sharedTypesOf, type FlatRecord } from '../stored-sheet';
import { changedRecordsOf, problemOfRecord } from './changed-records';
import { libraryLimit, recordLimits, updateBytesLimit } from './sheet-limits';

/** Why an edit is not taken. The names are those of the room's refusal frames. */
export type RefusalReason = 'undecodable' | 'gap' | 'schema' | 'size';

export type Admission =
  | { readonly ok: true; readonly changed: boolean }
  | { readonly ok: false; readonly reason: RefusalReason; readonly words: string };

/** Types of the sheet; any other top-level type in an update is foreign to it. */
const knownTypes = new Set<string>([...collectionNames, 'library', 'meta']);

/**
 * Applies one update to `candidate`, the room's document as committed, and says whether the result is a sheet.
 * Only the records that the update touched are read again. After a refusal the candidate holds what was refused:
 * build it anew from committed state.
 */
export function admitUpdate(candidate: Y.Doc, update: Uint8Array): Admission {
  if (update.byteLength > updateBytesLimit) {
    return { ok: false, reason: 'size', words: 'This edit is larger than 4 MiB. Paste or import it in smaller pieces.' };
  }
  sharedTypesOf(candidate);
  let touched: Y.Transaction | null = null;
  const note = (transaction: Y.Transaction) => { touched = transaction; };
  candidate.on('afterTransaction', note);
  try {
    Y.applyUpdate(candidate, update, 'admission');
  } catch {
    return { ok: false, reason: 'undecodable', words: 'This edit cannot be read.' };
  } finally {
    candidate.off('afterTransaction', note);
  }
  if (candidate.store.pendingStructs !== null || candidate.store.pendingDs !== null) {
    return { ok: false, reason: 'gap', words: 'This edit rests on one that the server has not seen.' };
  }
  const problem = touched ? problemOf(candidate, touched) : null;
  if (problem) return { ok: false, ...problem };
  return { ok: true, changed: touched !== null && (touched as Y.Transaction).changed.size > 0 };
}

function problemOf(doc: Y.Doc, transaction: Y.Transaction): { readonly reason: RefusalReason; readonly words: string } | null {
  for (const name of doc.share.keys()) {
    if (!knownTypes.has(name)) return { reason: 'schema', words: `A sheet has no ${name.slice(0, 40)}.` };
  }
  for (const name of collectionNames) {
    if (collectionOf(doc, name).size > recordLimits[name]) {
      return { reason: 'size', words: `A sheet takes at most ${recordLimits[name]} ${name}.` };
    }
  }
  for (const { collection, id } of changedRecordsOf(doc, transaction)) {
    const problem = problemOfRecord(doc, collection, id);
    if (problem) return { reason: problem.reason, words: `${collection} ${id.slice(0, 64)}: ${problem.words}` };
  }
  const meta = metaOf(doc);
  const schema = meta.get('schema');
  if (schema !== undefined && schema !== schemaVersion) {
    return { reason: 'schema', words: `The layout of this edit is ${String(schema)}; this server keeps layout ${schemaVersion}.` };
  }
  const title = meta.get('title');
  if (title !== undefined && (typeof title !== 'string' || title.length > 120)) return { reason: 'schema', words: 'The title is one line of at most 120 characters.' };
  const library = libraryOf(doc);
  if (library.size > libraryLimit) return { reason: 'size', words: `A sheet takes at most ${libraryLimit} models.` };
  if ([...transaction.changed.keys()].some((type) => (type as unknown) === library)) {
    const unreadable = readLibrary(library.toJSON() as FlatRecord).repairs[0];
    if (unreadable) return { reason: 'schema', words: `${unreadable.id} is no model.` };
  }
  return null;
}
