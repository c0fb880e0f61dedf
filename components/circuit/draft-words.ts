import type { Revision } from '@/lib/schemas/revision';

/** What a sheet is called: a draft is never shown as a revision. */
export function draftWords(newest: Revision | undefined, moved: boolean): string {
  if (!newest) return 'No revision yet';
  return moved ? `Draft after ${newest.letter}` : `As ${newest.letter}, unchanged`;
}

/** The revision field of the sheet's title block. */
export function draftLetter(newest: Revision | undefined, moved: boolean): string {
  if (!newest) return 'draft';
  return moved ? `${newest.letter} + draft` : newest.letter;
}
