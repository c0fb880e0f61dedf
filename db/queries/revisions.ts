import { and, asc, desc, eq, inArray, lt, or } from 'drizzle-orm';
import type { CircuitId, RevisionId } from '../authorized';
import type { Executor } from '../client';
import { findings, revisionContributors, revisionHoldPoints, revisionReviewers, revisions } from '../schema/revisions';

/** Columns of a revision without its netlist and drawing. */
const head = {
  id: revisions.id, circuitId: revisions.circuitId, number: revisions.number, letter: revisions.letter, seq: revisions.seq,
  contentHash: revisions.contentHash, presentationHash: revisions.presentationHash, note: revisions.note,
  cutBy: revisions.cutBy, cutAt: revisions.cutAt, askedAt: revisions.askedAt, askedBy: revisions.askedBy,
};
export type RevisionHead = Awaited<ReturnType<typeof revisionsOf>>[number];

/** Revisions of a circuit, newest first; `before` is the number after which the next page starts. */
export async function revisionsOf(db: Executor, circuit: CircuitId, { before, limit = 1_000 }: { before?: number; limit?: number } = {}) {
  return db.select(head).from(revisions)
    .where(before === undefined ? eq(revisions.circuitId, circuit) : and(eq(revisions.circuitId, circuit), lt(revisions.number, before)))
    .orderBy(desc(revisions.number)).limit(limit);
}

export async function revisionHead(db: Executor, revision: RevisionId): Promise<RevisionHead | undefined> {
  const [row] = await db.select(head).from(revisions).where(eq(revisions.id, revision));
  return row;
}

export async function revisionAtSeq(db: Executor, circuit: CircuitId, seq: number): Promise<RevisionHead | undefined> {
  const [row] = await db.select(head).from(revisions).where(and(eq(revisions.circuitId, circuit), eq(revisions.seq, seq)));
  return row;
}

/** Heads of all revisions of several circuits of one bench's list, newest first. */
export async function revisionsOfAll(db: Executor, circuitIds: readonly string[]): Promise<RevisionHead[]> {
  if (circuitIds.length === 0) return [];
  return db.select(head).from(revisions).where(inArray(revisions.circuitId, [...circuitIds])).orderBy(desc(revisions.number));
}

export async function revisionNetlist(db: Executor, revision: RevisionId) {
  const [row] = await db.select({ netlist: revisions.netlist }).from(revisions).where(eq(revisions.id, revision));
  return row?.netlist;
}

export async function revisionSheet(db: Executor, revision: RevisionId) {
  const [row] = await db.select({ sheet: revisions.sheet, volts: revisions.volts, seq: revisions.seq }).from(revisions).where(eq(revisions.id, revision));
  return row;
}

/** Stored findings in the collector's order. */
export async function revisionFindings(db: Executor, revision: RevisionId) {
  const rows = await db.select({ finding: findings.finding }).from(findings).where(eq(findings.revisionId, revision)).orderBy(asc(findings.position));
  return rows.map((row) => row.finding);
}

/** What a sign-off asks of the stored outcomes, for several revisions: all that do not simply pass, and every run of `lifted-lead`. */
export async function outcomesOf(db: Executor, revisionIds: readonly string[]) {
  if (revisionIds.length === 0) return [];
  return db.select({
    revisionId: findings.revisionId, fingerprint: findings.fingerprint, rule: findings.rule, outcome: findings.outcome,
    severity: findings.severity, refs: findings.refs, fromVolts: findings.fromVolts,
  }).from(findings).where(and(
    inArray(findings.revisionId, [...revisionIds]),
    or(inArray(findings.outcome, ['fail', 'undetermined', 'error']), eq(findings.rule, 'lifted-lead')),
  )).orderBy(asc(findings.position));
}

export async function holdPointsOf(db: Executor, revisionIds: readonly string[]) {
  if (revisionIds.length === 0) return [];
  return db.select().from(revisionHoldPoints).where(inArray(revisionHoldPoints.revisionId, [...revisionIds])).orderBy(asc(revisionHoldPoints.position));
}

export async function reviewersOf(db: Executor, revisionIds: readonly string[]) {
  if (revisionIds.length === 0) return [];
  return db.select({ revisionId: revisionReviewers.revisionId, personId: revisionReviewers.personId })
    .from(revisionReviewers).where(inArray(revisionReviewers.revisionId, [...revisionIds]));
}

export async function contributorsOf(db: Executor, revisionIds: readonly string[]) {
  if (revisionIds.length === 0) return [];
  return db.select({ revisionId: revisionContributors.revisionId, personId: revisionContributors.personId })
    .from(revisionContributors).where(inArray(revisionContributors.revisionId, [...revisionIds]));
}

/** Letter of a circuit's newest revision; what a link to it leads to. */
export async function newestRevisionLetter(db: Executor, circuitId: string): Promise<string | undefined> {
  const [row] = await db.select({ letter: revisions.letter }).from(revisions).where(eq(revisions.circuitId, circuitId)).orderBy(desc(revisions.number)).limit(1);
  return row?.letter;
}
