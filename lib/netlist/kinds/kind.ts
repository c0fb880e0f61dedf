import type { FactKey } from '../facts/fact-registry';
import type { DeckElement, NetlistPart } from '../netlist';
import type { KindEngine } from './kind-engine';
import type { KindId } from './kind-id';
import type { SymbolArt } from './symbol-art';

export const families = [
  'Switch', 'Drive', 'Load', 'Supply', 'Clamp and indicate', 'R and C', 'Control', 'Leads and points',
] as const;
/** Drawer section, ordered by the job. */
export type Family = (typeof families)[number];

export interface PinDefinition {
  readonly name: string;
  /** Sheet units (grid is 10) from the symbol's origin, before turning. */
  readonly x: number;
  readonly y: number;
}

/** One field of a kind's property form. Unit, label and parsing come from the fact registry. */
export interface FieldDefinition {
  readonly fact: FactKey;
  /** Overrides the registry's label where the kind has a better word (`value` → 'Resistance'). */
  readonly label?: string;
  /** Unit of `value`, whose unit depends on the kind. */
  readonly unit?: string;
  /** Offer values of this IEC 60063 series near what was typed. */
  readonly series?: 'E6' | 'E12' | 'E24' | 'E96';
  /** Facts without which the part cannot be examined at all: `value-missing` when absent. */
  readonly required?: boolean;
  /** Ratings that rules ask for: `rating-missing` when absent. */
  readonly rating?: boolean;
  readonly choices?: readonly string[];
  /** Inclusive bounds in SI units; outside is refused with the reason. */
  readonly min?: number;
  readonly max?: number;
}

/** Berkeley half: how a part of this kind stands in a deck that people exchange. */
export interface KindDeck {
  /** Element letter, upper case; null for kinds that leave no element (net names, notes, test points). */
  letterOf(part: NetlistPart): string | null;
  /** Element and model lines of one part. `name` is the element name, letter included; `node` maps a net name to a deck node. */
  write(part: NetlistPart, name: string, node: (net: string) => string): readonly string[];
  /** Takes an element that no fact line claims for another kind. `modelType` is nmos or pmos for a VDMOS card too. */
  read?(element: DeckElement, modelType: string | undefined): boolean;
  /** Pin name for each node position of the element; a name that is no pin of the kind (`B`, `S` of a transistor) is left out of the part. */
  readonly pinOrder: readonly string[];
  /** What the element carries where nobody gave a value. Only kinds whose `facts.value` is the element's number have it. */
  readonly placeholder?: number;
}

/** All halves of one kind of part. A missing half fails the type check. */
export interface Kind {
  readonly id: KindId;
  readonly title: string;
  readonly family: Family;
  /** Class letter of the designator (ASME Y14.44 where in everyday use); null for marks without one. */
  readonly letter: string | null;
  readonly pins: readonly PinDefinition[];
  readonly fields: readonly FieldDefinition[];
  /** Facts of a freshly placed part; every one of them counts as assumed unless the kind says otherwise. */
  readonly defaults: Readonly<Partial<Record<FactKey, number | string | boolean>>>;
  readonly symbol: SymbolArt;
  /** Other drawings of the same kind with the same pins. */
  readonly alternatives?: readonly SymbolArt[];
  readonly deck: KindDeck;
  readonly engine: KindEngine;
  /** The one or two lines printed beside the symbol, in fact keys, first to last (`['value', 'pmax']`). */
  readonly printed: readonly FactKey[];
}
