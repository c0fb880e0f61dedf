import type { BenchId } from '@/db/authorized';
import type { Database } from '@/db/client';
import { circuitRow, makersOf, mentorsOf, type CircuitRow } from '@/db/queries/circuits';
import { namesOf } from '@/db/queries/names';
import { contributorsOf, holdPointsOf, reviewersOf } from '@/db/queries/revisions';
import type { Caller } from '@/lib/access/caller';
import { circuitGate, type CircuitAccess } from '@/lib/access/gates';
import { may, type Standing } from '@/lib/access/may';
import { mintCircuit } from '@/lib/access/mint';
import { actions } from '@/lib/access/rights';
import { sheetToNetlist } from '@/lib/document/nets/sheet-to-netlist';
import { Problem } from '@/lib/errors/problem';
import { namingFor } from '@/lib/review/naming';
import { readReviewPicture, stateOf, type ReviewPicture } from '@/lib/review/review-view';
import { readLiveSheet } from '@/lib/rooms/live-sheet';
import type { Circuit } from '@/lib/schemas/circuit';
import { reachedOf } from './reached';
import { waitingFor } from './waiting-for';

/** Everything that views of some circuits share, read together. */
interface Surroundings {
  readonly picture: ReviewPicture;
  readonly makers: Awaited<ReturnType<typeof makersOf>>;
  readonly mentors: readonly string[];
  readonly reviewers: Awaited<ReturnType<typeof reviewersOf>>;
  readonly contributors: Awaited<ReturnType<typeof contributorsOf>>;
  readonly plans: Awaited<ReturnType<typeof holdPointsOf>>;
  readonly names: ReadonlyMap<string, string>;
}

async function surroundingsOf(db: Database, bench: BenchId, ids: readonly string[]): Promise<Surroundings> {
  const [picture, makers, mentors] = await Promise.all([readReviewPicture(db, ids), makersOf(db, ids), mentorsOf(db, bench)]);
  const revisions = picture.revisions.map(({ id }) => id);
  const [reviewers, contributors, plans] = await Promise.all([reviewersOf(db, revisions), contributorsOf(db, revisions), holdPointsOf(db, revisions)]);
  const names = await namesOf(db, [...makers.map(({ personId }) => personId), ...mentors, ...reviewers.map(({ personId }) => personId)]);
  return { picture, makers, mentors, reviewers, contributors, plans, names };
}

async function view(db: Database, row: CircuitRow, around: Surroundings, standing: Standing, now: Date): Promise<Circuit> {
  const live = await readLiveSheet(db, mintCircuit(row.id));
  const who = namingFor(standing)(around.names);
  const makers = around.makers.filter(({ circuitId }) => circuitId === row.id).map(({ personId }) => personId);
  const newest = around.picture.revisions.find(({ circuitId }) => circuitId === row.id);
  const state = newest ? stateOf(around.picture, newest) : null;
  const draft = newest === undefined || newest.contentHash !== live.contentHash;
  const plan = sheetToNetlist(live.sheet).holdPoints;
  const reached = reachedOf(around.picture, row.id, around.plans, now);
  const contributors = new Set([...makers, ...around.contributors.filter(({ revisionId }) => revisionId === newest?.id).map(({ personId }) => personId)]);
  const turns = waitingFor({
    state, draft, openStops: row.stops, makers,
    reviewers: around.reviewers.filter(({ revisionId }) => revisionId === newest?.id).map(({ personId }) => personId),
    mentors: around.mentors.filter((id) => !contributors.has(id)),
    mustAnswer: around.picture.mustAnswer.filter(({ circuitId }) => circuitId === row.id).length,
    signedToTheEnd: reached !== null && reached.volts >= (plan.at(-1)?.volts ?? 0),
  });
  return {
    id: row.id, title: row.title, bench: row.bench, state: state ?? 'draft', seq: live.seq, makers: makers.map(who),
    holdPoints: plan.map((point) => ({ ...point })), openStops: row.stops,
    counts: row.checkSeq === null ? null : { stop: row.stops ?? 0, caution: row.cautions ?? 0, advice: row.advices ?? 0, seq: row.checkSeq },
    blockedAt: row.blockedAt,
    newest: newest && state ? { id: newest.id, letter: newest.letter, state, seq: newest.seq } : null,
    draft, reached, waitingFor: turns.map(({ person, why }) => ({ ...who(person), why })),
    changedAt: row.changedAt.toISOString(), archivedAt: row.archivedAt?.toISOString() ?? null,
    may: actions.filter((action) => may(action, standing)),
  };
}

/** One circuit as its reader sees it. */
export async function circuitView(db: Database, access: CircuitAccess, now = new Date()): Promise<Circuit> {
  const row = await circuitRow(db, access.circuit);
  if (!row) throw new Problem('not-found');
  return view(db, row, await surroundingsOf(db, access.bench, [row.id]), access.standing, now);
}

/** Circuits of one bench as one of its people sees them. */
export async function circuitViews(db: Database, bench: BenchId, rows: readonly CircuitRow[], reader: { id: string; role: Standing['role'] }, now = new Date()): Promise<Circuit[]> {
  const around = await surroundingsOf(db, bench, rows.map(({ id }) => id));
  const makes = (row: CircuitRow) => around.makers.some(({ circuitId, personId }) => circuitId === row.id && personId === reader.id);
  const views: Circuit[] = [];
  for (const row of rows) views.push(await view(db, row, around, { role: reader.role, maker: makes(row), poster: row.postedBy === reader.id }, now));
  return views;
}

/** The same, with the reader's standing read anew: after an act that may have changed it. */
export async function circuitViewOf(db: Database, caller: Caller, circuitId: string, now = new Date()): Promise<Circuit> {
  return circuitView(db, await circuitGate(db, caller, circuitId), now);
}
