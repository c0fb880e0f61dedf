import type { RevisionId } from '@/db/authorized';
import type { Executor } from '@/db/client';
import { revisionSheet } from '@/db/queries/revisions';
import type { NetVolts } from '@/lib/check/net-volts';
import { decodeSheet } from '@/lib/document/encode-sheet';
import type { Sheet } from '@/lib/document/records';
import { Problem } from '@/lib/errors/problem';

/** The drawing of a revision, from its own copy, with the volts of its nets as the checks of the cut found them. */
export async function storedSheet(db: Executor, revision: RevisionId): Promise<Sheet & { readonly volts: NetVolts }> {
  const row = await revisionSheet(db, revision);
  if (!row) throw new Problem('not-found');
  return { ...decodeSheet(row.sheet).sheet, volts: row.volts ?? {} };
}
