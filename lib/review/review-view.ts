import type { ObjectionRow, SignOffRow } from '@/db/queries/review';
import { objectionsOf, openMustAnswer, signOffsOf } from '@/db/queries/review';
import { contributorsOf, holdPointsOf, outcomesOf, reviewersOf, revisionsOfAll, type RevisionHead } from '@/db/queries/revisions';
import { namesOf } from '@/db/queries/names';
import type { Executor } from '@/db/client';
import type { HoldPointInput } from '@/lib/schemas/hold-point';
import type { Objection, Revision, SignOff } from '@/lib/schemas/revision';
import type { PersonRef } from '@/lib/schemas/text';
import { requirementsOf, type ReviewFacts } from './requirements';
import { revisionState, type StateFacts } from './revision-state';

/** Everything about the reviews of some circuits, read together; answers about one revision are worked out from it. */
export interface ReviewPicture {
  readonly revisions: readonly RevisionHead[];
  readonly signOffs: readonly SignOffRow[];
  readonly objections: readonly ObjectionRow[];
  readonly mustAnswer: readonly { readonly id: string; readonly circuitId: string }[];
}

export async function readReviewPicture(db: Executor, circuitIds: readonly string[]): Promise<ReviewPicture> {
  const revisions = await revisionsOfAll(db, circuitIds);
  const [signOffs, objections, mustAnswer] = await Promise.all([
    signOffsOf(db, revisions.map(({ id }) => id)), objectionsOf(db, circuitIds), openMustAnswer(db, circuitIds),
  ]);
  return { revisions, signOffs, objections, mustAnswer };
}

/** Letter of the newest revision after this one that was put up for review. */
export const newerAsked = ({ revisions }: ReviewPicture, { circuitId, number }: RevisionHead): string | null =>
  revisions.find((other) => other.circuitId === circuitId && other.number > number && other.askedAt !== null)?.letter ?? null;

export function stateFacts(picture: ReviewPicture, revision: RevisionHead): StateFacts {
  const signOffs = picture.signOffs.filter(({ revisionId }) => revisionId === revision.id);
  return {
    asked: revision.askedAt !== null,
    newerAsked: newerAsked(picture, revision) !== null,
    standingSignOffs: signOffs.filter(({ standing }) => standing === 1).length,
    withdrawnSignOffs: signOffs.filter(({ standing }) => standing === null).length,
    objected: picture.objections.some(({ circuitId, standing }) => circuitId === revision.circuitId && standing === 1),
  };
}

export const stateOf = (picture: ReviewPicture, revision: RevisionHead) => revisionState(stateFacts(picture, revision));

/** What a sign-off of the revision depends on, without the hash a signer sends. */
export async function reviewFacts(db: Executor, picture: ReviewPicture, revisions: readonly RevisionHead[]): Promise<ReadonlyMap<string, ReviewFacts & { readonly plan: readonly HoldPointInput[] }>> {
  const ids = revisions.map(({ id }) => id);
  const [holdPoints, outcomes] = await Promise.all([holdPointsOf(db, ids), outcomesOf(db, ids)]);
  return new Map(revisions.map((revision) => {
    const plan = holdPoints.filter(({ revisionId }) => revisionId === revision.id);
    const objections = picture.objections.filter(({ circuitId }) => circuitId === revision.circuitId);
    return [revision.id, {
      holdPoints: plan.map(({ name, volts, sourceKnown }) => ({ name, volts, sourceKnown })),
      plan: plan.map(({ name, scenario, source, volts, amps }) => ({ name, ...(scenario ? { scenario } : {}), ...(source ? { source } : {}), volts, amps })),
      outcomes: outcomes.filter(({ revisionId }) => revisionId === revision.id),
      newerAsked: newerAsked(picture, revision),
      objections: objections.filter(({ standing }) => standing === 1).map(({ id }) => id),
      overridden: objections.filter(({ overrideReason }) => overrideReason !== null).map(({ id }) => id),
      mustAnswer: picture.mustAnswer.filter(({ circuitId }) => circuitId === revision.circuitId).map(({ id }) => id),
    }];
  }));
}

export type Naming = (id: string) => PersonRef;

export function signOffView(row: SignOffRow, who: Naming): SignOff {
  return {
    id: row.id, holdPoint: row.holdPoint, by: who(row.by), at: row.at.toISOString(), until: row.until.toISOString(), conditions: row.conditions,
    ...(row.withdrawnAt ? { withdrawnAt: row.withdrawnAt.toISOString() } : {}),
    ...(row.withdrawnBy ? { withdrawnBy: who(row.withdrawnBy) } : {}),
    ...(row.withdrawReason ? { withdrawReason: row.withdrawReason } : {}),
  };
}

export function objectionView(row: ObjectionRow, who: Naming): Objection {
  return {
    id: row.id, revision: { id: row.revisionId, letter: row.letter }, by: who(row.by), at: row.at.toISOString(), reason: row.reason,
    ...(row.liftedAt ? { liftedAt: row.liftedAt.toISOString() } : {}),
    ...(row.liftedBy ? { liftedBy: who(row.liftedBy) } : {}),
    ...(row.overrideReason ? { overrideReason: row.overrideReason } : {}),
  };
}

/** Revisions as the API answers them. `naming` makes the reader's view of people (initials for a guest). */
export async function revisionViews(
  db: Executor, picture: ReviewPicture, revisions: readonly RevisionHead[], naming: (names: ReadonlyMap<string, string>) => Naming,
): Promise<Revision[]> {
  const ids = revisions.map(({ id }) => id);
  const [facts, reviewers, contributors] = await Promise.all([reviewFacts(db, picture, revisions), reviewersOf(db, ids), contributorsOf(db, ids)]);
  const people = [
    ...revisions.map(({ cutBy }) => cutBy), ...reviewers.map(({ personId }) => personId), ...contributors.map(({ personId }) => personId),
    ...picture.signOffs.flatMap(({ by, withdrawnBy }) => [by, withdrawnBy ?? by]), ...picture.objections.flatMap(({ by, liftedBy }) => [by, liftedBy ?? by]),
  ];
  const who = naming(await namesOf(db, people));
  return revisions.map((revision) => {
    const its = facts.get(revision.id);
    if (!its) throw new Error(`Revision ${revision.id} has no facts.`);
    const count = (severity: string) => its.outcomes.filter((row) => row.outcome === 'fail' && row.severity === severity).length;
    return {
      id: revision.id, letter: revision.letter, circuitId: revision.circuitId, seq: revision.seq, contentHash: revision.contentHash,
      presentationHash: revision.presentationHash, state: stateOf(picture, revision), note: revision.note,
      cutBy: who(revision.cutBy), cutAt: revision.cutAt.toISOString(), askedAt: revision.askedAt?.toISOString() ?? null,
      reviewers: reviewers.filter(({ revisionId }) => revisionId === revision.id).map(({ personId }) => who(personId)),
      contributors: contributors.filter(({ revisionId }) => revisionId === revision.id).map(({ personId }) => who(personId)),
      holdPoints: [...its.plan],
      signOffs: picture.signOffs.filter(({ revisionId }) => revisionId === revision.id).map((row) => signOffView(row, who)),
      objections: picture.objections.filter(({ circuitId }) => circuitId === revision.circuitId).map((row) => objectionView(row, who)),
      requirements: requirementsOf(its),
      counts: { stop: count('stop'), caution: count('caution'), advice: count('advice'), undetermined: its.outcomes.filter(({ outcome }) => outcome === 'undetermined').length },
    };
  });
}
