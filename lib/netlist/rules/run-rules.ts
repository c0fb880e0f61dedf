import type { Circuit } from '../circuit/circuit';
import type { Finding } from '../findings/finding';
import { noPoints, type PointSet } from '../points/point-set';
import { stationsOf, type Station } from '../points/station';
import { collect, type Collected } from './collect';
import { settle } from './precedence';
import type { Outcome, Rule } from './rule';

/** Values of rule parameters that a bench has changed, by rule id. */
export type ParameterValues = Readonly<Record<string, Readonly<Record<string, number>>>>;

export interface RunOptions {
  readonly points?: PointSet;
  readonly parameters?: ParameterValues;
  /** Told the milliseconds each rule took, apart from the facts that rules share. */
  readonly onTime?: (rule: string, ms: number) => void;
  /** Milliseconds since any fixed moment; for `onTime`. */
  readonly now?: () => number;
}

function parametersInForce(rule: Rule, changed: Readonly<Record<string, number>> | undefined): Record<string, number> {
  return Object.fromEntries(Object.entries(rule.parameters).map(([name, parameter]) => [name, changed?.[name] ?? parameter.value]));
}

function errorOutcome(rule: Rule, cause: unknown): Outcome {
  return {
    outcome: 'error', severity: rule.severity, confidence: 'proven', target: { rule: [rule.id] }, refs: [], nets: [],
    holdPoint: null, scenario: null, state: 'as drawn', corner: 'typ',
    message: `The check ${rule.id} broke down and decided nothing: ${cause instanceof Error ? cause.message : String(cause)}`, evidence: [],
  };
}

function outcomesOf(rule: Rule, circuit: Circuit, { points = noPoints, parameters }: RunOptions): readonly Outcome[] {
  try {
    return rule.check({ netlist: circuit.netlist, circuit, points, parameters: parametersInForce(rule, parameters?.[rule.id]) });
  } catch (cause) {
    return [errorOutcome(rule, cause)];
  }
}

function collectRule(rule: Rule, circuit: Circuit, stations: readonly Station[], options: RunOptions): readonly Collected[] {
  const from = options.now?.() ?? 0;
  const collected = collect(rule, outcomesOf(rule, circuit, options), stations);
  if (options.now) options.onTime?.(rule.id, options.now() - from);
  return collected;
}

/** Runs rules over a circuit and settles what they say into one finding for each cause, of all outcomes. */
export function runRules(rules: readonly Rule[], circuit: Circuit, options: RunOptions = {}): readonly Finding[] {
  const stations = options.points?.stations.length ? options.points.stations : stationsOf(circuit);
  const collected = rules.flatMap((rule) => collectRule(rule, circuit, stations, options));
  return settle(collected).map(({ finding }) => finding);
}
