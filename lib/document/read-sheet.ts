import type * as Y from 'yjs';
import type { Sheet } from './records';
import { SheetReader } from './sheet-reader';
import type { Repair } from './repair/repair';

export interface ReadSheet {
  readonly sheet: Sheet;
  /** What had to be left out or renamed; empty for a sound document. */
  readonly repairs: readonly Repair[];
}

/** The sheet of a document, validated and repaired. Never throws: what cannot be read is left out and listed. */
export function readSheet(doc: Y.Doc): ReadSheet {
  return new SheetReader(doc).read();
}
