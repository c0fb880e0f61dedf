import { counted } from '@/components/ui/counted';
import type { Requirement, Revision, RevisionState } from '@/lib/schemas/revision';

export type Result = Requirement['result'];

/** One row of the sign-off table: a requirement at each hold point of the plan. */
export interface RequirementRow {
  readonly id: string;
  readonly words: string;
  readonly results: readonly { readonly holdPoint: string; readonly result: Result; readonly refs: readonly string[] }[];
  /** What the results rest on. */
  readonly restsOn: string;
  readonly worst: Result;
}

const words: Readonly<Record<string, string>> = {
  'not-in-review': 'Under review',
  'newer-revision': 'No newer one in review',
  'stale-hash': 'The hash sent is the hash stored',
  contributor: 'You made no part of it',
  'sign-in-again': 'Signed in less than 12 h ago',
  'open-stop': 'No stop open at or below',
  'rule-error': 'No check ended in error',
  'must-answer': 'No ‘must answer’ open',
  objection: 'No ‘ask for changes’ in force',
  'which-source': 'The plan says which source',
  'lifted-lead': 'Lifted leads: run at the cut',
};

const order = ['not-in-review', 'newer-revision', 'stale-hash', 'contributor', 'sign-in-again', 'open-stop', 'rule-error', 'must-answer', 'objection', 'which-source', 'lifted-lead'];

/** How bad a result is; what is worst decides. */
const weight: Readonly<Record<Result, number>> = { satisfied: 0, 'not applicable': 0, overridden: 1, 'not satisfied': 3, error: 2 };

/** True for the two results that refuse a sign-off. */
export function refuses(result: Result): boolean {
  return result === 'not satisfied' || result === 'error';
}

function worstOf(results: readonly { readonly result: Result }[]): Result {
  return results.reduce<Result>((worst, { result }) => (weight[result] > weight[worst] ? result : worst), results[0]?.result ?? 'not applicable');
}

/** Whether a revision can be signed at all as its review stands: asked for, not superseded, its sign-off not withdrawn. */
export function underReview({ state }: Revision): boolean {
  return state === 'in review' || state === 'changes asked' || state === 'signed off';
}

/** What only the signer's own session and part in the drawing decide; each null while unknown. */
export interface SignerFacts {
  readonly contributor: boolean | null;
  readonly signedInAt: string | null;
  readonly now: Date;
}

const reviewWords: Readonly<Record<RevisionState, string>> = {
  cut: 'cut; its maker has not asked for review yet',
  'in review': 'review was asked for',
  'changes asked': 'review was asked for',
  'signed off': 'review was asked for',
  superseded: 'superseded by a newer revision',
  withdrawn: 'its sign-off was withdrawn; a new revision is reviewed afresh',
};

const freshFor = 12 * 3_600_000;

function restsOn(id: string, revision: Revision, signer: SignerFacts, refs: readonly string[], worst: Result): string {
  const named = [...new Set(refs)].join(', ');
  switch (id) {
    case 'not-in-review': return reviewWords[revision.state];
    case 'newer-revision': return worst === 'satisfied' ? `${revision.letter}; none newer is in review` : `${named} is in review`;
    case 'contributor': return `made by ${revision.contributors.map((person) => person.name).join(', ') || 'nobody known'}`;
    case 'sign-in-again': return worst === 'satisfied' ? 'this session' : 'sign in again, then come back';
    case 'open-stop': return named === '' ? `${counted(revision.counts.stop, 'stop')} stored at the cut` : `stops on ${named}`;
    case 'rule-error': return named === '' ? 'every check ended' : `ended in error: ${named}`;
    case 'must-answer': return worst === 'satisfied' ? 'none open' : `${refs.length === 0 ? 1 : new Set(refs).size} open in the margin`;
    case 'objection': {
      const inForce = revision.objections.filter((objection) => !objection.liftedAt);
      const overridden = revision.objections.filter((objection) => objection.overrideReason);
      if (inForce.length > 0) return `asked by ${inForce.map((objection) => objection.by.name).join(', ')}`;
      return overridden.length > 0 ? `overridden by ${overridden.map((objection) => objection.liftedBy?.name ?? 'a steward').join(', ')}` : 'nobody asks';
    }
    case 'which-source': return worst === 'satisfied' ? 'one source for each hold point' : 'name the source in the plan';
    case 'lifted-lead': return worst === 'not applicable' ? 'no lead to lift' : 'stored with the revision';
    default: return named;
  }
}

/** The table of requirements by hold points, with the signer's own rows put in. */
export function requirementRows(revision: Revision, signer: SignerFacts): readonly RequirementRow[] {
  const points = revision.holdPoints.map((point) => point.name);
  const own = (id: string, result: Result): readonly Requirement[] => points.map((holdPoint) => ({ id, holdPoint, result, refs: [] }));
  const fresh = signer.signedInAt === null ? null : signer.now.getTime() - new Date(signer.signedInAt).getTime() <= freshFor;
  const all: readonly Requirement[] = [
    ...own('not-in-review', underReview(revision) ? 'satisfied' : 'not satisfied'),
    ...revision.requirements.map((requirement) => (requirement.id === 'stale-hash' && requirement.result === 'not applicable' ? { ...requirement, result: 'satisfied' as const } : requirement)),
    ...(signer.contributor === null ? [] : own('contributor', signer.contributor ? 'not satisfied' : 'satisfied')),
    ...(fresh === null ? [] : own('sign-in-again', fresh ? 'satisfied' : 'not satisfied')),
  ];
  const ids = [...new Set(all.map((requirement) => requirement.id))].sort((a, b) => (order.indexOf(a) + 99) % 99 - (order.indexOf(b) + 99) % 99);
  return ids.map((id) => {
    const results = points.map((holdPoint) => {
      const found = all.find((requirement) => requirement.id === id && requirement.holdPoint === holdPoint);
      return { holdPoint, result: found?.result ?? ('not applicable' as const), refs: found?.refs ?? [] };
    });
    const worst = worstOf(results);
    const rest = id === 'stale-hash' ? revision.contentHash.slice(0, 16).replace(/(.{4})(?=.)/gu, '$1 ') : restsOn(id, revision, signer, results.flatMap((result) => (refuses(result.result) ? result.refs : [])), worst);
    return { id, words: words[id] ?? id, results, restsOn: rest, worst };
  });
}

export interface Reason {
  readonly id: string;
  readonly words: string;
  readonly result: Result;
  readonly refs: readonly string[];
  readonly restsOn: string;
}

/** What stands against signing at one hold point. */
export function reasonsAgainst(rows: readonly RequirementRow[], holdPoint: string): readonly Reason[] {
  return rows.flatMap((row) => {
    const at = row.results.find((result) => result.holdPoint === holdPoint);
    return at && refuses(at.result) ? [{ id: row.id, words: row.words, result: at.result, refs: at.refs, restsOn: row.restsOn }] : [];
  });
}
