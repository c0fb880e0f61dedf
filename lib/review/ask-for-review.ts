import { inTransaction } from '@/db/transaction';
import { writeAudit } from '@/db/mutations/audit';
import { lockCircuit, touchCircuit } from '@/db/mutations/circuits';
import { insertReviewers, markAsked } from '@/db/mutations/revisions';
import { membersAmong } from '@/db/queries/people';
import type { RevisionAccess } from '@/lib/access/gates';
import { stillMay } from '@/lib/access/still-may';
import { Problem } from '@/lib/errors/problem';
import type { Ask } from '@/lib/schemas/revision';
import { entry, first, refuseArchived, repeat, type Act, type Outcome } from './act';
import { readReviewPicture, reviewFacts, stateOf } from './review-view';

/**
 * Puts a revision up for review; older unsigned ones become superseded by that. No reviewers named means any mentor.
 * Asked again it changes nothing. Throws `newer-revision`, `revision-closed`, or `rule-error` when a check did not finish.
 */
export async function askForReview(act: Act, access: RevisionAccess, input: Ask): Promise<Outcome<null>> {
  return inTransaction(act.db, async (tx) => {
    refuseArchived(await lockCircuit(tx, access.circuit));
    await stillMay(tx, act.person.id, ['ask for review'], access);
    const picture = await readReviewPicture(tx, [access.circuit]);
    const revision = picture.revisions.find(({ id }) => id === access.revision);
    if (!revision) throw new Problem('not-found');
    const state = stateOf(picture, revision);
    if (state === 'superseded') throw new Problem('newer-revision');
    if (state === 'withdrawn') throw new Problem('revision-closed', 'Its sign-off was withdrawn.');
    if (revision.askedAt !== null) return repeat(null);

    const failed = (await reviewFacts(tx, picture, [revision])).get(revision.id)?.outcomes.filter(({ outcome }) => outcome === 'error') ?? [];
    if (failed.length > 0) throw new Problem('rule-error', undefined, { refs: [...new Set(failed.flatMap(({ refs }) => refs))] });
    const reviewers = [...new Set(input.reviewers)];
    const known = new Set((await membersAmong(tx, access.bench, reviewers)).map(({ id }) => id));
    const strangers = reviewers.filter((id) => !known.has(id));
    if (strangers.length > 0) {
      throw new Problem('input-wrong', 'A reviewer is not on this bench.', { errors: strangers.map((id) => ({ path: `reviewers.${reviewers.indexOf(id)}`, message: 'Not on this bench.' })) });
    }
    await markAsked(tx, access.revision, act.person.id, act.now);
    await insertReviewers(tx, access.revision, reviewers, act.now);
    await touchCircuit(tx, access.circuit, act.now);
    await writeAudit(tx, entry(act, access, 'asked for review', { revision: access.revision, letter: revision.letter, reviewers }));
    return first(null);
  });
}
