import { ulid } from 'ulid';
import { inTransaction } from '@/db/transaction';
import { writeAudit } from '@/db/mutations/audit';
import { lockCircuit, touchCircuit } from '@/db/mutations/circuits';
import { insertObjection } from '@/db/mutations/review';
import type { RevisionAccess } from '@/lib/access/gates';
import { stillMay } from '@/lib/access/still-may';
import { Problem } from '@/lib/errors/problem';
import { entry, first, refuseArchived, repeat, type Act, type Outcome } from './act';
import { readReviewPicture, stateOf } from './review-view';

/**
 * Asks for changes of a revision under review. It stays in force over later revisions until the same person lifts it or a
 * steward overrides it. One person has at most one in force for a revision: asked again it answers that one.
 */
export async function askForChanges(act: Act, access: RevisionAccess, reason: string): Promise<Outcome<string>> {
  return inTransaction(act.db, async (tx) => {
    refuseArchived(await lockCircuit(tx, access.circuit));
    await stillMay(tx, act.person.id, ['ask for changes'], access);
    const picture = await readReviewPicture(tx, [access.circuit]);
    const revision = picture.revisions.find(({ id }) => id === access.revision);
    if (!revision) throw new Problem('not-found');
    const own = picture.objections.find((row) => row.revisionId === access.revision && row.by === act.person.id && row.standing === 1);
    if (own) return repeat(own.id);
    const state = stateOf(picture, revision);
    if (state === 'superseded') throw new Problem('newer-revision');
    if (state !== 'in review' && state !== 'changes asked') throw new Problem('not-in-review');

    const id = ulid(act.now.getTime());
    await insertObjection(tx, { id, circuitId: access.circuit, revisionId: access.revision, by: act.person.id, at: act.now, reason });
    await touchCircuit(tx, access.circuit, act.now);
    await writeAudit(tx, entry(act, access, 'asked for changes', { revision: access.revision, letter: revision.letter, objection: id }));
    return first(id);
  });
}
