import type { Finding, OutcomeKind, Severity } from '../findings/finding';
import { fingerprintOf, targetKey } from '../findings/fingerprint';
import type { Station } from '../points/station';
import type { Outcome, Rule } from './rule';

/** A finding with the stable ids it is about, for precedence between rules. */
export interface Collected {
  readonly finding: Finding;
  readonly ids: ReadonlySet<string>;
}

const outcomeRank: Readonly<Record<OutcomeKind, number>> = { error: 4, fail: 3, undetermined: 2, pass: 1, 'not applicable': 0 };
const severityRank: Readonly<Record<Severity, number>> = { stop: 2, caution: 1, advice: 0 };

export const isWorse = (a: Severity, b: Severity): boolean => severityRank[a] > severityRank[b];

interface Placed {
  readonly outcome: Outcome;
  /** Place in the plan, lowest first; an outcome that does not depend on the plan stands at its start. */
  readonly place: number;
}

/** Worst first; equally bad ones by place in the plan: the lowest fail, the highest pass. */
function compare(a: Placed, b: Placed): number {
  const byOutcome = outcomeRank[b.outcome.outcome] - outcomeRank[a.outcome.outcome];
  if (byOutcome !== 0) return byOutcome;
  if (a.outcome.outcome === 'pass') return b.place - a.place;
  return severityRank[b.outcome.severity] - severityRank[a.outcome.severity] || a.place - b.place;
}

function milderBelow(worst: Placed, all: readonly Placed[], stations: readonly Station[]) {
  if (worst.outcome.outcome !== 'fail') return [];
  const milder = all
    .filter(({ outcome, place }) => outcome.outcome === 'fail' && place < worst.place && isWorse(worst.outcome.severity, outcome.severity))
    .sort((a, b) => a.place - b.place)[0];
  if (!milder) return [];
  return [{
    entity: worst.outcome.refs[0] ?? '', quantity: 'milder from', value: stations[milder.place]?.volts ?? 0, unit: 'V',
    source: `${milder.outcome.severity} at ${milder.outcome.holdPoint ?? 'every hold point'}`,
  }];
}

function toFinding(rule: Pick<Rule, 'id' | 'version'>, key: string, all: readonly Placed[], stations: readonly Station[]): Collected {
  const worst = all.length === 1 ? all[0]! : [...all].sort(compare)[0]!;
  const { outcome } = worst;
  const fingerprint = fingerprintOf(key);
  const station = stations[worst.place];
  const finding: Finding = {
    id: fingerprint,
    fingerprint,
    rule: rule.id,
    outcome: outcome.outcome,
    severity: outcome.severity,
    confidence: outcome.confidence,
    refs: [...new Set(outcome.refs)].slice(0, 4),
    nets: [...outcome.nets],
    holdPoint: station?.holdPoint ?? null,
    fromVolts: station?.holdPoint == null ? null : station.volts,
    scenario: outcome.scenario ?? station?.scenario ?? null,
    state: outcome.state,
    corner: outcome.corner,
    message: outcome.message,
    evidence: [...outcome.evidence, ...milderBelow(worst, all, stations)],
    ...(outcome.remedy ? { remedy: outcome.remedy } : {}),
  };
  return { finding, ids: new Set(Object.values(outcome.target).flat()) };
}

/** One finding for each fingerprint: the worst over the plan. `stations` are in the plan's order. */
export function collect(rule: Pick<Rule, 'id' | 'version'>, outcomes: readonly Outcome[], stations: readonly Station[]): readonly Collected[] {
  const groups = new Map<string, Placed[]>();
  for (const outcome of outcomes) {
    const key = targetKey(rule.id, rule.version, outcome.target);
    const place = Math.max(0, stations.findIndex((station) => station.holdPoint === outcome.holdPoint));
    const group = groups.get(key);
    if (group) group.push({ outcome, place });
    else groups.set(key, [{ outcome, place }]);
  }
  return [...groups].map(([key, group]) => toFinding(rule, key, group, stations));
}
