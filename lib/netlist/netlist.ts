import type { FactKey } from './facts/fact-registry';
import type { KindId } from './kinds/kind-id';

/** A fact's value: SI number, label, yes/no, or a range `[from, to]` in SI units. */
export type FactValue = number | string | boolean | readonly [number, number];

/** What is known of a part or a net, keyed by the vocabulary shared with deck fact lines. */
export type Facts = Readonly<Partial<Record<FactKey, FactValue>>>;

/** Where a value comes from. Absent means that a person typed it. */
export type FactOrigin = 'typed' | 'data sheet' | 'catalogue' | 'model card' | 'assumed';

/** A time-dependent source, arguments in SPICE order and SI units. */
export interface Wave {
  readonly shape: 'sin' | 'pulse' | 'exp' | 'pwl';
  readonly args: readonly number[];
}

/** A `.model` card: known type and numeric parameters only. */
export interface ModelCard {
  readonly name: string;
  /** Lower-case SPICE type: d, npn, pnp, nmos, pmos, vdmos, sw, r, c, l. `vdmos` polarity stands in `flags`. */
  readonly type: string;
  readonly params: Readonly<Record<string, number>>;
  /** Flag words of the card, lower case (`pchan`). */
  readonly flags: readonly string[];
}

/** One element as a deck wrote it, already parsed; engine decks are generated anew from it, never from user text. */
export interface DeckElement {
  /** Berkeley element letter, upper case. */
  readonly letter: string;
  /** Element name without changes of case, letter included (`R1`, `XQ1`). */
  readonly name: string;
  readonly nodes: readonly string[];
  /** Main number: ohms, farads, henries, DC volts or amps. */
  readonly value?: number;
  readonly wave?: Wave;
  /** Model or subcircuit name. */
  readonly model?: string;
  /** Instance parameters (`W`, `L`, `AREA`, `M`, `IC`, `TC1`), lower-case keys. */
  readonly params: Readonly<Record<string, number>>;
  /** What followed the nodes of an element that is not examined, as written. */
  readonly text?: string;
  readonly line: number;
}

export interface Subcircuit {
  readonly name: string;
  readonly pins: readonly string[];
  readonly elements: readonly DeckElement[];
  readonly models: readonly ModelCard[];
  readonly subcircuits: readonly Subcircuit[];
}

export interface NetlistPart {
  /** Stable id (ULID on a sheet, derived from the designator for a bare deck). */
  readonly id: string;
  /** Reference designator as shown: `Q1`. Contacts of one plug share theirs. */
  readonly ref: string;
  readonly kind: KindId;
  /** Pin name → net name. Every pin of the kind has an entry. */
  readonly pins: Readonly<Record<string, string>>;
  readonly facts: Facts;
  readonly origins: Readonly<Partial<Record<FactKey, FactOrigin>>>;
  readonly wave?: Wave;
  /** Name of a model or subcircuit in `Netlist.models` / `Netlist.subcircuits`. */
  readonly model?: string;
  /** Instance parameters kept from a deck. */
  readonly params?: Readonly<Record<string, number>>;
  /** Pins that a person marked *left open*. */
  readonly leftOpen: readonly string[];
}

export interface Net {
  /** '0' for the 0 V net, else the first given name, else a canonical `N1`, `N2` … */
  readonly name: string;
  /** Names that people gave it on the sheet, sorted; empty for an unnamed net. */
  readonly givenNames: readonly string[];
  /** `Q1:G`, in canonical order (IEC 61666 pin reference). */
  readonly pins: readonly string[];
  readonly facts: Facts;
}

/** A named set of source values with an ambient temperature. */
export interface Scenario {
  readonly name: string;
  /** °C. */
  readonly ambient: number;
  /** By designator of the source. `volts` is DC for a DC source, V rms for an AC one; `amps` a current limit. */
  readonly values: Readonly<Record<string, { readonly volts?: number; readonly amps?: number }>>;
}

/** A step of the power-up plan. `volts`: DC for a DC source, V rms for an AC one. */
export interface HoldPoint {
  readonly name: string;
  readonly scenario?: string;
  /** Designator of the power source; without it the only source whose role is supply or mains. */
  readonly source?: string;
  readonly volts: number;
  readonly amps: number;
}

/**
 * The canonical netlist: what rules read, what is hashed, what `GET …/netlist` returns.
 * Parts are in natural designator order, nets by name with '0' first; the same sheet gives the same bytes.
 */
export interface Netlist {
  readonly format: 1;
  readonly title: string;
  readonly parts: readonly NetlistPart[];
  readonly nets: readonly Net[];
  readonly models: readonly ModelCard[];
  readonly subcircuits: readonly Subcircuit[];
  readonly scenarios: readonly Scenario[];
  /** Ascending by volts. */
  readonly holdPoints: readonly HoldPoint[];
}
