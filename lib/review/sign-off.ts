import { ulid } from 'ulid';
import type { Transaction } from '@/db/client';
import { inTransaction } from '@/db/transaction';
import { writeAudit } from '@/db/mutations/audit';
import { lockCircuit, touchCircuit } from '@/db/mutations/circuits';
import { insertSignOff } from '@/db/mutations/review';
import type { RevisionAccess } from '@/lib/access/gates';
import { stillMay } from '@/lib/access/still-may';
import { Problem } from '@/lib/errors/problem';
import type { NewSignOff, Requirement } from '@/lib/schemas/revision';
import { entry, first, refuseArchived, repeat, type Act, type Outcome } from './act';
import { firstUnmet, requirementsOf, undeterminedAt } from './requirements';
import { readReviewPicture, reviewFacts, stateOf, type ReviewPicture } from './review-view';
import { signOffCode, type SigningCode } from './signing-code';
import { validUntil } from './valid-until';

/**
 * Signs a revision off up to one hold point. Everything it depends on is read in the transaction that signs, with the circuit
 * held, so that of two acts at once one comes first and the other sees it. Sent twice by one person it answers the first one.
 */
export async function signOff(act: Act, access: RevisionAccess, input: NewSignOff): Promise<Outcome<string>> {
  const until = validUntil(input.until, act.now);
  return inTransaction(act.db, async (tx) => {
    refuseArchived(await lockCircuit(tx, access.circuit));
    await stillMay(tx, act.person.id, ['sign off'], access);
    const picture = await readReviewPicture(tx, [access.circuit]);
    const revision = picture.revisions.find(({ id }) => id === access.revision);
    const facts = revision && (await reviewFacts(tx, picture, [revision])).get(revision.id);
    if (!revision || !facts) throw new Problem('not-found');
    const point = facts.holdPoints.find(({ name }) => name === input.holdPoint);
    if (!point) throw new Problem('hold-point-unknown', `“${input.holdPoint}” is not in the plan of revision ${revision.letter}.`);

    const earlier = standingAt(picture, access.revision, point.name);
    if (earlier?.by === act.person.id && input.contentHash === revision.contentHash) return repeat(earlier.id);
    const requirements = requirementsOf({ ...facts, hashMatches: input.contentHash === revision.contentHash });
    const closed = stateOf(picture, revision) === 'withdrawn' && facts.newerAsked === null;
    if (revision.askedAt === null || closed) throw new Problem('not-in-review', undefined, { requirements, refs: [] });

    refuseUnmet(firstUnmet(requirements, point.name), requirements);
    refuseCovered(picture, access.revision, facts.holdPoints, point);

    const id = ulid(act.now.getTime());
    await insertSignOff(tx, {
      id, revisionId: access.revision, holdPoint: point.name, contentHash: revision.contentHash, by: act.person.id, at: act.now, until,
      conditions: input.conditions ?? null, undetermined: undeterminedAt(facts.outcomes, point.volts).map(({ fingerprint }) => fingerprint),
    });
    await recordSigning(tx, act, access, { signOff: id, letter: revision.letter, holdPoint: point.name, contentHash: revision.contentHash, until: until.toISOString() });
    return first(id);
  });
}

const standingAt = (picture: ReviewPicture, revisionId: string, holdPoint: string) =>
  picture.signOffs.find((row) => row.revisionId === revisionId && row.holdPoint === holdPoint && row.standing === 1);

function refuseUnmet(unmet: Requirement | undefined, requirements: readonly Requirement[]): void {
  if (!unmet) return;
  const code: SigningCode = signOffCode(unmet.id);
  throw new Problem(code, undefined, { requirements, refs: unmet.refs });
}

/** What is signed up to a hold point is signed below it as well. */
function refuseCovered(
  picture: ReviewPicture, revisionId: string, plan: readonly { readonly name: string; readonly volts: number }[], point: { readonly volts: number },
): void {
  const covering = plan.find(({ name, volts }) => volts >= point.volts && standingAt(picture, revisionId, name));
  if (covering) throw new Problem('already-signed', `This revision is signed off up to “${covering.name}”.`);
}

async function recordSigning(tx: Transaction, act: Act, access: RevisionAccess, detail: Record<string, string>): Promise<void> {
  await touchCircuit(tx, access.circuit, act.now);
  await writeAudit(tx, entry(act, access, 'signed off', { revision: access.revision, ...detail }));
}
