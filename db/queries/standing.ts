import { and, eq, isNull, sql } from 'drizzle-orm';
import type { BenchRole } from '@/lib/schemas/bench';
import type { Executor } from '../client';
import { circuitMakers, circuits, guestLinks } from '../schema/circuits';
import { benches, memberships } from '../schema/people';
import { objections, signOffs } from '../schema/review';
import { revisionContributors, revisionReviewers, revisions } from '../schema/revisions';
import { rtContributor } from '../schema/room';
import { messages, threads } from '../schema/threads';

/** A circuit with what decides who may do what with it. Gates only. */
export async function circuitFacts(db: Executor, circuitId: string) {
  const [row] = await db.select({
    id: circuits.id, benchId: circuits.benchId, bench: benches.slug, postedBy: circuits.postedBy, archivedAt: circuits.archivedAt,
  }).from(circuits).innerJoin(benches, eq(benches.id, circuits.benchId)).where(eq(circuits.id, circuitId));
  return row;
}

/** A person's role on the circuit's bench and whether they are its maker; nothing for a stranger. `lock` holds the rows. */
export async function standingOf(db: Executor, circuitId: string, personId: string, { lock = false } = {}) {
  // Drizzle writes `for share`, which MariaDB does not know.
  const [rows] = await db.execute(sql`select ${memberships.role} as role, ${circuitMakers.id} as makerRow
    from ${circuits}
    join ${memberships} on ${memberships.benchId} = ${circuits.benchId} and ${memberships.personId} = ${personId}
    left join ${circuitMakers} on ${circuitMakers.circuitId} = ${circuits.id} and ${circuitMakers.personId} = ${personId}
      and ${circuitMakers.standing} = 1
    where ${circuits.id} = ${circuitId} ${lock ? sql`lock in share mode` : sql``}`) as unknown as [{ role: BenchRole; makerRow: string | null }[]];
  return rows[0];
}

export async function circuitOfRevision(db: Executor, revisionId: string) {
  const [row] = await db.select({ circuitId: revisions.circuitId }).from(revisions).where(eq(revisions.id, revisionId));
  return row?.circuitId;
}

/**
 * A person's part in a revision. Contributors are those stored at the cut and every maker of the circuit, also one who
 * was named later: whoever edits after the cut is among them.
 */
export async function partIn(db: Executor, revisionId: string, personId: string) {
  const [stored, made, reviewer] = await Promise.all([
    db.$count(revisionContributors, and(eq(revisionContributors.revisionId, revisionId), eq(revisionContributors.personId, personId))),
    db.select({ id: circuitMakers.id }).from(circuitMakers).innerJoin(revisions, eq(revisions.circuitId, circuitMakers.circuitId))
      .where(and(eq(revisions.id, revisionId), eq(circuitMakers.personId, personId))).limit(1),
    db.$count(revisionReviewers, and(eq(revisionReviewers.revisionId, revisionId), eq(revisionReviewers.personId, personId))),
  ]);
  return { contributor: stored > 0 || made.length > 0, reviewer: reviewer > 0 };
}

/** True for whoever changed the live sheet electrically or was ever its maker. */
export async function contributesTo(db: Executor, circuitId: string, personId: string): Promise<boolean> {
  const [edits, makers] = await Promise.all([
    db.$count(rtContributor, and(eq(rtContributor.roomId, circuitId), eq(rtContributor.personId, personId))),
    db.$count(circuitMakers, and(eq(circuitMakers.circuitId, circuitId), eq(circuitMakers.personId, personId))),
  ]);
  return edits + makers > 0;
}

export async function placeOfSignOff(db: Executor, id: string) {
  const [row] = await db.select({ revisionId: signOffs.revisionId, by: signOffs.by }).from(signOffs).where(eq(signOffs.id, id));
  return row;
}

export async function placeOfObjection(db: Executor, id: string) {
  const [row] = await db.select({ revisionId: objections.revisionId, by: objections.by }).from(objections).where(eq(objections.id, id));
  return row;
}

export async function placeOfThread(db: Executor, id: string) {
  const [row] = await db.select({ circuitId: threads.circuitId, by: threads.openedBy, mustAnswer: threads.mustAnswer }).from(threads).where(eq(threads.id, id));
  return row;
}

export async function placeOfMessage(db: Executor, id: string) {
  const [row] = await db.select({ circuitId: threads.circuitId, threadId: messages.threadId, by: messages.by })
    .from(messages).innerJoin(threads, eq(threads.id, messages.threadId)).where(eq(messages.id, id));
  return row;
}

/** A guest link in force, by the SHA-256 of its token. */
export async function guestLinkByHash(db: Executor, tokenHash: string) {
  const [row] = await db.select({ id: guestLinks.id, circuitId: guestLinks.circuitId })
    .from(guestLinks).innerJoin(circuits, eq(circuits.id, guestLinks.circuitId))
    .where(and(eq(guestLinks.tokenHash, tokenHash), isNull(guestLinks.endedAt), sql`${guestLinks.expiresAt} > utc_timestamp(3)`));
  return row;
}
