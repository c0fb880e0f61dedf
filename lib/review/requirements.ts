import type { Requirement } from '@/lib/schemas/revision';

/** A stored outcome as far as a sign-off asks about it. */
export interface StoredOutcome {
  readonly fingerprint: string;
  readonly rule: string;
  readonly outcome: string;
  readonly severity: string;
  readonly refs: readonly string[];
  /** Volts of the lowest hold point where it holds; null when it does not depend on the plan. */
  readonly fromVolts: number | null;
}

/** Everything a sign-off depends on, read in the transaction that signs. */
export interface ReviewFacts {
  readonly holdPoints: readonly { readonly name: string; readonly volts: number; readonly sourceKnown: boolean }[];
  readonly outcomes: readonly StoredOutcome[];
  /** Letter of a newer revision that was put up for review. */
  readonly newerAsked: string | null;
  /** Ids of objections on the circuit that are in force, and of those a steward overrode. */
  readonly objections: readonly string[];
  readonly overridden: readonly string[];
  /** Ids of open threads marked 'must answer', whichever revision they were written on. */
  readonly mustAnswer: readonly string[];
  /** False when the hash a signer sent is not the revision's; undefined when nobody is signing. */
  readonly hashMatches?: boolean;
}

type Judged = Pick<Requirement, 'result' | 'refs'>;
const satisfied: Judged = { result: 'satisfied', refs: [] };
const against = (refs: readonly string[]): Judged => (refs.length === 0 ? satisfied : { result: 'not satisfied', refs: [...new Set(refs)] });

/** Stops that block a hold point: those that hold there or lower down, and those that hold everywhere. */
export const stopsAt = (outcomes: readonly StoredOutcome[], volts: number): StoredOutcome[] =>
  outcomes.filter(({ outcome, severity, fromVolts }) => outcome === 'fail' && severity === 'stop' && (fromVolts === null || fromVolts <= volts));

/** Undetermined outcomes of stop rules at or below a hold point: listed to the signer and kept with the sign-off. */
export const undeterminedAt = (outcomes: readonly StoredOutcome[], volts: number): StoredOutcome[] =>
  outcomes.filter(({ outcome, severity, fromVolts }) => outcome === 'undetermined' && severity === 'stop' && (fromVolts === null || fromVolts <= volts));

function objection({ objections, overridden }: ReviewFacts): Judged {
  if (objections.length > 0) return against(objections);
  return overridden.length > 0 ? { result: 'overridden', refs: [...overridden] } : satisfied;
}

function ruleError({ outcomes }: ReviewFacts): Judged {
  const failed = outcomes.filter(({ outcome }) => outcome === 'error');
  return failed.length === 0 ? satisfied : { result: 'error', refs: [...new Set(failed.flatMap(({ rule, refs }) => (refs.length > 0 ? refs : [rule])))] };
}

/** The lifted-lead check runs at the cut; with no lead to lift there is nothing to check. */
function liftedLead({ outcomes }: ReviewFacts): Judged {
  const runs = outcomes.filter(({ rule, outcome }) => rule === 'lifted-lead' && outcome !== 'not applicable');
  return runs.length === 0 ? { result: 'not applicable', refs: [] } : satisfied;
}

/** In the order in which a refusal names the first that is not met. */
const judges: readonly (readonly [id: string, judge: (facts: ReviewFacts, point: ReviewFacts['holdPoints'][number]) => Judged])[] = [
  ['newer-revision', ({ newerAsked }) => against(newerAsked === null ? [] : [newerAsked])],
  ['stale-hash', ({ hashMatches }) => (hashMatches === undefined ? { result: 'not applicable', refs: [] } : hashMatches ? satisfied : { result: 'not satisfied', refs: [] })],
  ['open-stop', ({ outcomes }, { volts }) => against(stopsAt(outcomes, volts).flatMap(({ refs }) => refs))],
  ['objection', objection],
  ['must-answer', ({ mustAnswer }) => against(mustAnswer)],
  ['rule-error', ruleError],
  ['which-source', (_, { name, sourceKnown }) => against(sourceKnown ? [] : [name])],
  ['lifted-lead', liftedLead],
];

/** Every requirement at every hold point of the plan, lowest first. */
export function requirementsOf(facts: ReviewFacts): Requirement[] {
  return facts.holdPoints.flatMap((point) => judges.map(([id, judge]) => ({ id, holdPoint: point.name, ...judge(facts, point) })));
}

/** The first requirement at a hold point that stands against signing; an error never counts as satisfied. */
export function firstUnmet(requirements: readonly Requirement[], holdPoint: string): Requirement | undefined {
  return requirements.find((requirement) => requirement.holdPoint === holdPoint
    && (requirement.result === 'not satisfied' || requirement.result === 'error'));
}
