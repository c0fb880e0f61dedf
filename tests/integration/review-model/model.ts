import type { BenchRole } from '@/lib/schemas/bench';

/** The plan of every circuit here, lowest first. */
export const plan = [{ name: '15 V', volts: 15 }, { name: '36 V', volts: 36 }, { name: '85 V', volts: 85 }] as const;

export interface ModelRevision {
  readonly seq: number;
  readonly value: number;
  readonly contributors: readonly string[];
  /** Lowest volts that a stop blocks; null for none. */
  readonly stopFrom: number | null;
  readonly error: boolean;
  asked: boolean;
  reviewers: readonly string[];
}
export interface ModelSignOff { readonly revision: number; readonly point: number; readonly by: string; standing: boolean; withdrawnBy?: string }
export interface ModelObjection { readonly revision: number; readonly by: string; standing: boolean; endedBy?: string }
export interface ModelThread { readonly by: string; readonly must: boolean; resolved: boolean }

/** What docs/review.md says a circuit's review is, in plain data and without a database. */
export interface Model {
  readonly roles: Record<string, BenchRole>;
  readonly poster: string;
  makers: readonly string[];
  everMakers: readonly string[];
  editors: readonly string[];
  seq: number;
  value: number;
  readonly revisions: ModelRevision[];
  readonly signOffs: ModelSignOff[];
  readonly objections: ModelObjection[];
  readonly threads: ModelThread[];
}

/** Findings of the next cut are decided by its value, so that the checker and the model agree. */
export const stopFromOf = (value: number): number | null => ([null, null, null, null, null, 15, 36, 85] as const)[value % 8] ?? null;
export const errorOf = (value: number): boolean => value % 17 === 0;

export type Action =
  | { readonly act: 'edit'; readonly who: string; readonly value: number }
  | { readonly act: 'cut'; readonly who: string }
  | { readonly act: 'ask'; readonly who: string; readonly revision: number; readonly reviewers: readonly string[] }
  | { readonly act: 'sign'; readonly who: string; readonly revision: number; readonly point: number; readonly foreignHash: boolean }
  | { readonly act: 'withdraw'; readonly who: string; readonly signOff: number; readonly reason: boolean }
  | { readonly act: 'object'; readonly who: string; readonly revision: number }
  | { readonly act: 'lift'; readonly who: string; readonly objection: number; readonly reason: boolean }
  | { readonly act: 'note'; readonly who: string; readonly must: boolean }
  | { readonly act: 'resolve'; readonly who: string; readonly thread: number }
  | { readonly act: 'makers'; readonly who: string; readonly makers: readonly string[] }
  | { readonly act: 'role'; readonly who: string; readonly role: BenchRole };

const without = (list: readonly string[], more: readonly string[]): readonly string[] => [...new Set([...list, ...more])];
const newerAsked = (model: Model, revision: number) => model.revisions.some(({ asked }, index) => index > revision && asked);
const standing = (model: Model, revision: number) => model.signOffs.filter((row) => row.revision === revision && row.standing);
const objected = (model: Model) => model.objections.some((row) => row.standing);

export function stateOf(model: Model, revision: number): string {
  if (standing(model, revision).length > 0) return 'signed off';
  if (model.signOffs.some((row) => row.revision === revision)) return 'withdrawn';
  if (newerAsked(model, revision)) return 'superseded';
  if (!model.revisions[revision]?.asked) return 'cut';
  return objected(model) ? 'changes asked' : 'in review';
}

/** Does `action` to the model, and answers what the product must answer: `ok`, `repeat`, or the code of the refusal. */
export function step(model: Model, action: Action): string {
  const role = model.roles[action.who] ?? 'member';
  const maker = model.makers.includes(action.who);
  switch (action.act) {
    case 'role':
      model.roles[action.who] = action.role;
      return 'ok';
    case 'edit':
      if (!maker) return 'not-allowed';
      if (action.value === model.value) return 'ok';
      model.value = action.value;
      model.seq += 1;
      model.editors = without(model.editors, [action.who]);
      return 'ok';
    case 'makers':
      if (action.who !== model.poster && role !== 'steward') return 'not-allowed';
      model.makers = without([model.poster], action.makers);
      model.everMakers = without(model.everMakers, model.makers);
      return 'ok';
    case 'cut':
      // A repeat at one seq is answered before anything is decided anew: nothing happens by it.
      if (model.revisions.some(({ seq }) => seq === model.seq)) return 'repeat';
      if (!maker) return 'not-allowed';
      model.revisions.push({
        seq: model.seq, value: model.value, contributors: without(model.editors, model.everMakers), stopFrom: stopFromOf(model.value),
        error: errorOf(model.value), asked: false, reviewers: [],
      });
      return 'ok';
    case 'note':
      model.threads.push({ by: action.who, must: action.must, resolved: false });
      return 'ok';
    case 'resolve': return resolve(model, action, role, maker);
    case 'ask': return ask(model, action, maker);
    case 'sign': return sign(model, action, role);
    case 'withdraw': return withdraw(model, action, role);
    case 'object': return object(model, action, role);
    case 'lift': return lift(model, action, role);
  }
}

function resolve(model: Model, { who, thread }: Extract<Action, { act: 'resolve' }>, role: BenchRole, maker: boolean): string {
  const note = model.threads[thread] as ModelThread;
  const author = note.by === who;
  const contributor = model.editors.includes(who) || model.everMakers.includes(who);
  const may = note.must ? author || (role === 'mentor' && !contributor) : author || maker || role !== 'member';
  if (!may) return 'not-allowed';
  note.resolved = true;
  return 'ok';
}

function ask(model: Model, { revision, reviewers }: Extract<Action, { act: 'ask' }>, maker: boolean): string {
  const row = model.revisions[revision] as ModelRevision;
  if (!maker) return 'not-allowed';
  const state = stateOf(model, revision);
  if (state === 'superseded') return 'newer-revision';
  if (state === 'withdrawn') return 'revision-closed';
  if (row.asked) return 'repeat';
  if (row.error) return 'rule-error';
  row.asked = true;
  row.reviewers = reviewers;
  return 'ok';
}

function sign(model: Model, { who, revision, point, foreignHash }: Extract<Action, { act: 'sign' }>, role: BenchRole): string {
  const row = model.revisions[revision] as ModelRevision;
  if (role !== 'mentor') return 'not-allowed';
  if (row.contributors.includes(who) || model.everMakers.includes(who)) return 'contributor';
  const signed = standing(model, revision);
  if (!foreignHash && signed.some((each) => each.point === point && each.by === who)) return 'repeat';
  if (!row.asked) return 'not-in-review';
  if (newerAsked(model, revision)) return 'newer-revision';
  if (stateOf(model, revision) === 'withdrawn') return 'not-in-review';
  if (foreignHash) return 'stale-hash';
  if (row.stopFrom !== null && row.stopFrom <= (plan[point]?.volts ?? 0)) return 'open-stop';
  if (objected(model)) return 'objection';
  if (model.threads.some(({ must, resolved }) => must && !resolved)) return 'must-answer';
  if (row.error) return 'rule-error';
  if (signed.some((each) => each.point >= point)) return 'already-signed';
  model.signOffs.push({ revision, point, by: who, standing: true });
  return 'ok';
}

function withdraw(model: Model, { who, signOff, reason }: Extract<Action, { act: 'withdraw' }>, role: BenchRole): string {
  const row = model.signOffs[signOff] as ModelSignOff;
  if (role !== 'steward' && !(role === 'mentor' && row.by === who)) return 'not-allowed';
  if (role === 'steward' && !reason) return 'input-wrong';
  if (!row.standing) return row.withdrawnBy === who ? 'ok' : 'already-withdrawn';
  row.standing = false;
  row.withdrawnBy = who;
  return 'ok';
}

function object(model: Model, { who, revision }: Extract<Action, { act: 'object' }>, role: BenchRole): string {
  const row = model.revisions[revision] as ModelRevision;
  if (role !== 'mentor' && !(role === 'member' && row.reviewers.includes(who))) return 'not-allowed';
  if (model.objections.some((each) => each.revision === revision && each.by === who && each.standing)) return 'repeat';
  const state = stateOf(model, revision);
  if (state === 'superseded') return 'newer-revision';
  if (state !== 'in review' && state !== 'changes asked') return 'not-in-review';
  model.objections.push({ revision, by: who, standing: true });
  return 'ok';
}

function lift(model: Model, { who, objection, reason }: Extract<Action, { act: 'lift' }>, role: BenchRole): string {
  const row = model.objections[objection] as ModelObjection;
  if (role !== 'steward' && row.by !== who) return 'not-allowed';
  if (role === 'steward' && !reason) return 'input-wrong';
  if (!row.standing) return row.endedBy === who ? 'ok' : 'already-lifted';
  row.standing = false;
  row.endedBy = who;
  return 'ok';
}
