import type { DeckElement, FactValue, ModelCard, Subcircuit } from '../netlist';

/** Something skipped or kept without a meaning. Never an error. `line` counts from 1. */
export interface DeckNotice {
  readonly line: number;
  readonly text: string;
}

/** Why a deck cannot be read. */
export interface DeckError {
  readonly line: number;
  readonly reason: string;
}

/** `*@NAME key=value …`: facts of the element or the node of that name. */
export interface FactLine {
  readonly line: number;
  readonly name: string;
  readonly facts: Readonly<Record<string, FactValue>>;
}

/** A deck as read: everything that has a meaning here, values in SI units. */
export interface DeckDocument {
  readonly title: string;
  /** Elements of the top level, those not examined among them, in the order of the file. */
  readonly elements: readonly DeckElement[];
  readonly models: readonly ModelCard[];
  readonly subcircuits: readonly Subcircuit[];
  readonly params: Readonly<Record<string, number>>;
  /** °C of `.temp` or `.options temp`, when given. */
  readonly temp?: number;
  /** Numeric options, lower-case keys (`tnom`, `reltol`). */
  readonly options: Readonly<Record<string, number>>;
  readonly factLines: readonly FactLine[];
  readonly notices: readonly DeckNotice[];
}

export type DeckReading =
  | { readonly ok: true; readonly document: DeckDocument }
  | { readonly ok: false; readonly errors: readonly DeckError[] };

/** Element letters that are read and simulated; any other is a box, not examined. */
export const examinedLetters = 'RCLDMQVIX';

export function isExamined(element: DeckElement): boolean {
  return examinedLetters.includes(element.letter);
}
