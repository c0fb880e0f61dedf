import { and, asc, eq, inArray, ne } from 'drizzle-orm';
import type { Executor } from '../client';
import { objections, signOffs } from '../schema/review';
import { revisions } from '../schema/revisions';
import { threads } from '../schema/threads';

export type SignOffRow = typeof signOffs.$inferSelect;
export type ObjectionRow = Awaited<ReturnType<typeof objectionsOf>>[number];

export async function signOffsOf(db: Executor, revisionIds: readonly string[]): Promise<SignOffRow[]> {
  if (revisionIds.length === 0) return [];
  return db.select().from(signOffs).where(inArray(signOffs.revisionId, [...revisionIds])).orderBy(asc(signOffs.at), asc(signOffs.id));
}

export async function signOffById(db: Executor, id: string): Promise<SignOffRow | undefined> {
  const [row] = await db.select().from(signOffs).where(eq(signOffs.id, id));
  return row;
}

const objection = {
  id: objections.id, circuitId: objections.circuitId, revisionId: objections.revisionId, letter: revisions.letter, by: objections.by, at: objections.at,
  reason: objections.reason, standing: objections.standing, liftedAt: objections.liftedAt, liftedBy: objections.liftedBy,
  overrideReason: objections.overrideReason,
};

/** Every objection of several circuits, whichever revision it was written on, oldest first. */
export async function objectionsOf(db: Executor, circuitIds: readonly string[]) {
  if (circuitIds.length === 0) return [];
  return db.select(objection).from(objections).innerJoin(revisions, eq(revisions.id, objections.revisionId))
    .where(inArray(objections.circuitId, [...circuitIds])).orderBy(asc(objections.at), asc(objections.id));
}

export async function objectionById(db: Executor, id: string): Promise<ObjectionRow | undefined> {
  const [row] = await db.select(objection).from(objections).innerJoin(revisions, eq(revisions.id, objections.revisionId)).where(eq(objections.id, id));
  return row;
}

/** Threads that gate a sign-off: marked 'must answer' and not resolved. */
export async function openMustAnswer(db: Executor, circuitIds: readonly string[]) {
  if (circuitIds.length === 0) return [];
  return db.select({ id: threads.id, circuitId: threads.circuitId }).from(threads)
    .where(and(inArray(threads.circuitId, [...circuitIds]), eq(threads.mustAnswer, true), ne(threads.status, 'resolved'))).orderBy(asc(threads.id));
}
