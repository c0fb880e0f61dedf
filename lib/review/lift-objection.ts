import { inTransaction } from '@/db/transaction';
import { writeAudit } from '@/db/mutations/audit';
import { lockCircuit, touchCircuit } from '@/db/mutations/circuits';
import { endObjection } from '@/db/mutations/review';
import { objectionById } from '@/db/queries/review';
import type { RevisionAccess } from '@/lib/access/gates';
import { stillMay } from '@/lib/access/still-may';
import { Problem } from '@/lib/errors/problem';
import type { Ending } from '@/lib/schemas/revision';
import { entry, type Act } from './act';

/** Ends an objection: whoever asked lifts it, a steward overrides it with a reason that stays visible. */
export async function liftObjection(act: Act, access: RevisionAccess & { readonly objection: string }, input: Ending): Promise<void> {
  await inTransaction(act.db, async (tx) => {
    await lockCircuit(tx, access.circuit);
    const row = await objectionById(tx, access.objection);
    if (!row) throw new Problem('not-found');
    const standing = await stillMay(tx, act.person.id, ['lift own objection', 'override an objection'], { ...access, author: row.by === act.person.id });
    const overrides = standing.role === 'steward';
    if (overrides && input.reason === undefined) {
      throw new Problem('input-wrong', 'reason: A steward gives the reason.', { errors: [{ path: 'reason', message: 'A steward gives the reason.' }] });
    }
    if (row.standing === null) {
      if (row.liftedBy === act.person.id) return;
      throw new Problem('already-lifted');
    }
    await endObjection(tx, row.id, act.person.id, act.now, overrides ? input.reason ?? null : null);
    await touchCircuit(tx, access.circuit, act.now);
    await writeAudit(tx, entry(act, access, overrides ? 'overrode an objection' : 'lifted an objection', {
      revision: row.revisionId, objection: row.id, askedBy: row.by, reason: input.reason ?? null,
    }));
  });
}
