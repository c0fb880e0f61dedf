import type * as Y from 'yjs';
import { contentHashOf } from '@/lib/document/nets/sheet-to-netlist';
import { readSheet } from '@/lib/document/read-sheet';

/** Content hash of the sheet in a document: changes exactly when an edit changed what the circuit does. */
export function documentHash(doc: Y.Doc): string {
  return contentHashOf(readSheet(doc).sheet);
}
