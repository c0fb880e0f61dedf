import type { ModelCard, NetlistPart, Subcircuit } from '../netlist';

/** How a conducting edge between two pins counts in the topological checks before a run (`docs/engine.md` 3.6). */
export type EdgeStiffness =
  /** Resistor, coil, closed contact, source: conducts both ways at DC. */
  | 'solid'
  /** Junction or channel: conducts at DC in some states only. */
  | 'soft'
  /** Joins for islands only: capacitor, current source, gate. */
  | 'none';

/** Stands in an edge for the 0 V net where a run ties a pin to it. */
export const groundEnd = '#0';

export interface KindEdge {
  readonly from: string;
  /** A pin, or `groundEnd`. */
  readonly to: string;
  readonly stiffness: EdgeStiffness;
  /** Sets a voltage by itself (V source, inductor at DC): two of them closing a ring is a source loop. */
  readonly stiff?: 'source' | 'coil';
}

/** Threshold or gain corner of the transistors in a run. */
export type Corner = 'min' | 'typ' | 'max';

/** What a source or contact is set to in one run; absent keys keep the part's own facts. */
export interface PartSetting {
  /** DC volts at which a source stands. */
  readonly volts?: number;
  /** Current limit in amps; null lifts the limit. */
  readonly amps?: number | null;
  /** Opened: the part's elements are left out of the run. */
  readonly removed?: boolean;
}

export interface EngineContext {
  readonly corner: Corner;
  /** Ambient in °C, 25 unless the scenario says otherwise. */
  readonly ambient: number;
  readonly setting: PartSetting;
  /** Generated, injection-free name of this part (`p12`); elements must be named letter + this + optional suffix. */
  readonly name: string;
  /** Generated node of a pin (`n7`, `0`). */
  node(pin: string): string;
  /** A generated node private to this part (`n7` style), the same for the same key. */
  innerNode(key: string): string;
  readonly card: ModelCard | undefined;
  /** What the part's `model` may name besides its own card. */
  readonly library: { readonly models: readonly ModelCard[]; readonly subcircuits: readonly Subcircuit[] };
}

/** Current into a pin, amps: a raw-file vector and its sign, or the sum of several. */
export type CurrentProbe = readonly { readonly vector: string; readonly sign: 1 | -1 }[];

export interface EngineElements {
  /** Element and `.model` lines, generated names and numbers only. */
  readonly lines: readonly string[];
  /** Current into each pin named here. For two-pin parts the first pin is enough. */
  readonly currents: Readonly<Record<string, CurrentProbe>>;
  /** What the model had to assume, as fact keys with words (`vth_typ: mean of min and max`). */
  readonly assumed: readonly { readonly fact: string; readonly words: string }[];
}

/** Engine half of a kind: topology before a run and elements of a run. */
export interface KindEngine {
  /** Edges of the part for the checks before a run. `undefined` pins do not occur. */
  edges(part: NetlistPart): readonly KindEdge[];
  /** Pins whose voltage decides what the part does (gate, base). */
  readonly controlPins: readonly string[];
  /**
   * Elements of one run, or the fact that is missing for it. A part without elements of its own (note, net name)
   * answers with no lines.
   */
  elements(part: NetlistPart, context: EngineContext): EngineElements | { readonly missing: string };
}
