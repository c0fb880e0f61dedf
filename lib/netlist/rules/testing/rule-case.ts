import type { OutcomeKind, Severity } from '../../findings/finding';
import type { HoldPoint, Netlist, Scenario } from '../../netlist';

/** What a rule is to say of a case: its worst outcome, or `none` where it has nothing to say. */
export interface Expected {
  readonly outcome: OutcomeKind | 'none';
  /** Of a fail. */
  readonly severity?: Severity;
  /** Designators in order, all of them. */
  readonly refs?: readonly string[];
  /** A part of the message. */
  readonly says?: string | RegExp;
  readonly holdPoint?: string;
  readonly state?: string;
}

/** One row of a rule's table: a circuit as a deck, and what the rule is to say of it. */
export interface RuleCase {
  readonly name: string;
  /** Deck lines without title and `.end`. */
  readonly deck: string;
  readonly plan?: readonly HoldPoint[];
  readonly scenarios?: readonly Scenario[];
  /** What a deck cannot say: *left open* marks, two parts of one designator. */
  readonly edit?: (netlist: Netlist) => Netlist;
  /** Parameters that differ from the rule's own. */
  readonly parameters?: Readonly<Record<string, number>>;
  readonly expect: Expected;
}

/** A case with another value of one of the rule's parameters, and what then is said. */
export const withParameter = (row: RuleCase, name: string, value: number, expect: Expected): RuleCase =>
  ({ ...row, name: `${row.name}, ${name} ${value}`, parameters: { ...row.parameters, [name]: value }, expect });
