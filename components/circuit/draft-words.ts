import { contentHashOf, presentationHash } from '@/lib/document/nets/sheet-to-netlist';
import type { Sheet } from '@/lib/document/records';
import type { Revision } from '@/lib/schemas/revision';

/** How a sheet stands to its newest revision: the same, drawn otherwise, or another circuit. */
export type Moved = 'not' | 'drawing' | 'electrical';

/** Compares the sheet with what was cut, by the hashes of both. */
export function movedSince(newest: Pick<Revision, 'contentHash' | 'presentationHash'> | undefined, sheet: Sheet): Moved {
  if (!newest || contentHashOf(sheet) !== newest.contentHash) return 'electrical';
  return presentationHash(sheet) === newest.presentationHash ? 'not' : 'drawing';
}

/** What a sheet is called: a draft is never shown as a revision. */
export function draftWords(newest: Pick<Revision, 'letter'> | undefined, moved: Moved): string {
  if (!newest) return 'Draft, no revision yet';
  if (moved === 'not') return `As ${newest.letter}, unchanged`;
  return moved === 'drawing' ? `Draft, after ${newest.letter} · drawing only` : `Draft, after ${newest.letter}`;
}

/** The revision field of the sheet's title block. */
export function draftLetter(newest: Pick<Revision, 'letter'> | undefined, moved: Moved): string {
  if (!newest) return 'draft';
  return moved === 'not' ? newest.letter : `${newest.letter} + draft`;
}
