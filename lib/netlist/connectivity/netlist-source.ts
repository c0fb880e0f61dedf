import type { KindId } from '../kinds/kind-id';
import type { FactOrigin, FactValue, HoldPoint, ModelCard, Scenario, Subcircuit, Wave } from '../netlist';
import type { EndKey } from './end-key';

/** A part, mark or note as it stands on a sheet; placement is of no concern here. */
export interface DrawnPart {
  readonly id: string;
  readonly ref: string;
  readonly kind: KindId;
  /** Facts by key; keys outside the vocabulary, brought by a deck, are kept. */
  readonly facts: Readonly<Record<string, FactValue>>;
  readonly origins: Readonly<Record<string, FactOrigin>>;
  readonly leftOpen: readonly string[];
  readonly wave?: Wave;
  readonly model?: string;
  readonly params?: Readonly<Record<string, number>>;
  /** Pin names of a box, in order. */
  readonly boxPins?: readonly string[];
}

/** What a netlist is built from. Scenarios and hold points name their sources by designator. */
export interface NetlistSource {
  readonly title: string;
  readonly parts: readonly DrawnPart[];
  /** Pairs of ends that are one node: both ends of every wire. */
  readonly joins: readonly (readonly [EndKey, EndKey])[];
  readonly scenarios: readonly Scenario[];
  readonly holdPoints: readonly HoldPoint[];
  readonly models: readonly ModelCard[];
  readonly subcircuits: readonly Subcircuit[];
}
