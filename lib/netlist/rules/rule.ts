import type { Circuit } from '../circuit/circuit';
import type { Confidence, Evidence, OutcomeKind, Remedy, Severity } from '../findings/finding';
import type { Corner } from '../kinds/kind-engine';
import type { Netlist } from '../netlist';
import type { DriveState } from '../points/point';
import type { PointSet } from '../points/point-set';

/** A parameter of a rule: a number with its unit and where it comes from ('common practice, no source' where none is named). */
export interface RuleParameter {
  readonly value: number;
  readonly unit: string;
  readonly words: string;
  readonly source: string;
}

export type RuleParameters = Readonly<Record<string, RuleParameter>>;

/** What a rule reads. Immutable; no clock, network, randomness or shared state. */
export interface RuleInput<P extends RuleParameters = RuleParameters> {
  readonly netlist: Netlist;
  /** Derived facts computed once: graph, DC islands, stages, controls. */
  readonly circuit: Circuit;
  /** Operating points by hold point, state, level and corner; empty for a topology rule. */
  readonly points: PointSet;
  /** Values of the rule's parameters in force. */
  readonly parameters: { readonly [K in keyof P]: number };
}

/** One outcome for one target at one place of the plan. The collector keeps the worst for each fingerprint. */
export interface Outcome {
  readonly outcome: OutcomeKind;
  readonly severity: Severity;
  readonly confidence: Confidence;
  /** Role → part ids or net names: makes the fingerprint with rule id and version. Never text, position or display name. */
  readonly target: Readonly<Record<string, readonly string[]>>;
  /** One to four designators, the part to change first. */
  readonly refs: readonly string[];
  readonly nets: readonly string[];
  /** Hold point at which this outcome holds; null when it does not depend on the plan ("every hold point"). */
  readonly holdPoint: string | null;
  readonly scenario: string | null;
  readonly state: DriveState;
  readonly corner: Corner;
  readonly message: string;
  readonly evidence: readonly Evidence[];
  /** For `undetermined`: the one fact that is missing, as `Q1 vgs_max`, or a reason such as `needs transient`. */
  readonly missing?: string;
  readonly remedy?: Remedy;
}

export interface Rule<P extends RuleParameters = RuleParameters> {
  readonly id: string;
  /** Raised whenever verdicts can change; part of the fingerprint. */
  readonly version: number;
  readonly title: string;
  /** Worst severity the rule can report. */
  readonly severity: Severity;
  /** `topology` rules run at once in the browser; `points` rules when the engine has answered. */
  readonly needs: 'topology' | 'points';
  readonly parameters: P;
  check(input: RuleInput<P>): readonly Outcome[];
}
