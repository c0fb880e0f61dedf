import { and, asc, desc, eq, inArray, isNotNull, isNull, lt, or } from 'drizzle-orm';
import type { BenchId, CircuitId } from '../authorized';
import type { Executor } from '../client';
import { circuitChecks, circuitMakers, circuits } from '../schema/circuits';
import { benches, memberships } from '../schema/people';
import { rtRoom } from '../schema/room';

const row = {
  id: circuits.id, benchId: circuits.benchId, bench: benches.slug, title: circuits.title, postedBy: circuits.postedBy,
  archivedAt: circuits.archivedAt, changedAt: circuits.changedAt, headSeq: rtRoom.headSeq,
  checkSeq: circuitChecks.seq, stops: circuitChecks.stops, cautions: circuitChecks.cautions, advices: circuitChecks.advices,
  blockedAt: circuitChecks.blockedAt,
};
const selected = (db: Executor) => db.select(row).from(circuits)
  .innerJoin(benches, eq(benches.id, circuits.benchId))
  .innerJoin(rtRoom, eq(rtRoom.roomId, circuits.id))
  .leftJoin(circuitChecks, eq(circuitChecks.circuitId, circuits.id));

export type CircuitRow = Awaited<ReturnType<typeof circuitRow>> & object;

export async function circuitRow(db: Executor, circuit: CircuitId) {
  const [found] = await selected(db).where(eq(circuits.id, circuit));
  return found;
}

/** A page of a bench's circuits, last changed first. */
export async function circuitRows(
  db: Executor, bench: BenchId, { after, limit, archived }: { after?: { changedAt: Date; id: string }; limit: number; archived: boolean },
): Promise<CircuitRow[]> {
  return selected(db).where(and(
    eq(circuits.benchId, bench),
    archived ? isNotNull(circuits.archivedAt) : isNull(circuits.archivedAt),
    after && or(lt(circuits.changedAt, after.changedAt), and(eq(circuits.changedAt, after.changedAt), lt(circuits.id, after.id))),
  )).orderBy(desc(circuits.changedAt), desc(circuits.id)).limit(limit);
}

/** Makers in force of several circuits, in the order in which they were named. */
export async function makersOf(db: Executor, circuitIds: readonly string[]) {
  if (circuitIds.length === 0) return [];
  return db.select({ circuitId: circuitMakers.circuitId, personId: circuitMakers.personId }).from(circuitMakers)
    .where(and(inArray(circuitMakers.circuitId, [...circuitIds]), eq(circuitMakers.standing, 1)))
    .orderBy(asc(circuitMakers.since), asc(circuitMakers.id));
}

/** Every maker past and present: contributors of each revision. */
export async function allMakersOf(db: Executor, circuit: CircuitId): Promise<string[]> {
  const rows = await db.selectDistinct({ personId: circuitMakers.personId }).from(circuitMakers).where(eq(circuitMakers.circuitId, circuit));
  return rows.map((maker) => maker.personId);
}

/** Ids of the circuits that a person makes, on one bench. */
export async function ownCircuits(db: Executor, bench: BenchId, personId: string): Promise<string[]> {
  const rows = await db.select({ id: circuits.id }).from(circuits)
    .innerJoin(circuitMakers, and(eq(circuitMakers.circuitId, circuits.id), eq(circuitMakers.personId, personId), eq(circuitMakers.standing, 1)))
    .where(eq(circuits.benchId, bench));
  return rows.map((circuit) => circuit.id);
}

export async function mentorsOf(db: Executor, bench: BenchId): Promise<string[]> {
  const rows = await db.select({ id: memberships.personId }).from(memberships).where(and(eq(memberships.benchId, bench), eq(memberships.role, 'mentor')));
  return rows.map((mentor) => mentor.id);
}

/** Circuits whose sheet has moved on since the server last checked it. */
export async function uncheckedCircuits(db: Executor, limit: number): Promise<{ id: string; headSeq: number; checkSeq: number | null }[]> {
  return db.select({ id: circuits.id, headSeq: rtRoom.headSeq, checkSeq: circuitChecks.seq }).from(circuits)
    .innerJoin(rtRoom, eq(rtRoom.roomId, circuits.id))
    .leftJoin(circuitChecks, eq(circuitChecks.circuitId, circuits.id))
    .where(and(isNull(circuits.archivedAt), isNull(rtRoom.quarantinedAt), or(isNull(circuitChecks.seq), lt(circuitChecks.seq, rtRoom.headSeq))))
    .limit(limit);
}

export async function circuitTitle(db: Executor, circuit: CircuitId): Promise<string | undefined> {
  const [row] = await db.select({ title: circuits.title }).from(circuits).where(eq(circuits.id, circuit));
  return row?.title;
}
