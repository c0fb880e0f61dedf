import type { RevisionId } from '@/db/authorized';
import type { Executor } from '@/db/client';
import { revisionSheet } from '@/db/queries/revisions';
import { decodeSheet } from '@/lib/document/encode-sheet';
import type { Sheet } from '@/lib/document/records';
import { Problem } from '@/lib/errors/problem';

/** The drawing of a revision, from its own copy. */
export async function storedSheet(db: Executor, revision: RevisionId): Promise<Sheet> {
  const row = await revisionSheet(db, revision);
  if (!row) throw new Problem('not-found');
  return decodeSheet(row.sheet).sheet;
}
