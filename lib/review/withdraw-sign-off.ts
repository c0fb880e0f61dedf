import { inTransaction } from '@/db/transaction';
import { writeAudit } from '@/db/mutations/audit';
import { lockCircuit, touchCircuit } from '@/db/mutations/circuits';
import { voidSignOff } from '@/db/mutations/review';
import { signOffById } from '@/db/queries/review';
import type { RevisionAccess } from '@/lib/access/gates';
import { stillMay } from '@/lib/access/still-may';
import { Problem } from '@/lib/errors/problem';
import type { Ending } from '@/lib/schemas/revision';
import { entry, type Act } from './act';

/** Makes a sign-off void: by its signer, or by a steward with a reason. Sent twice by one person it changes nothing more. */
export async function withdrawSignOff(act: Act, access: RevisionAccess & { readonly signOff: string }, input: Ending): Promise<void> {
  await inTransaction(act.db, async (tx) => {
    await lockCircuit(tx, access.circuit);
    const row = await signOffById(tx, access.signOff);
    if (!row) throw new Problem('not-found');
    const own = row.by === act.person.id;
    const standing = await stillMay(tx, act.person.id, ['withdraw own sign-off', 'withdraw another’s sign-off'], { ...access, author: own });
    if (standing.role === 'steward' && input.reason === undefined) {
      throw new Problem('input-wrong', 'reason: A steward gives the reason.', { errors: [{ path: 'reason', message: 'A steward gives the reason.' }] });
    }
    if (row.standing === null) {
      if (row.withdrawnBy === act.person.id) return;
      throw new Problem('already-withdrawn');
    }
    await voidSignOff(tx, row.id, act.person.id, act.now, input.reason ?? null);
    await touchCircuit(tx, access.circuit, act.now);
    await writeAudit(tx, entry(act, access, 'withdrew a sign-off', {
      revision: access.revision, signOff: row.id, holdPoint: row.holdPoint, signedBy: row.by, reason: input.reason ?? null,
    }));
  });
}
