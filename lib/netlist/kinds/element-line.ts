import { deckNumber, deckParameters } from '../deck/deck-number';
import type { NetlistPart } from '../netlist';
import type { KindDeck } from './kind';

type NodeOf = (net: string) => string;

/** Deck nodes of the pins named, in that order. */
export function nodesOf(part: NetlistPart, pins: readonly string[], node: NodeOf): string {
  return pins.map((pin) => node(part.pins[pin] as string)).join(' ');
}

/** Instance parameters kept from a deck, with a leading space, or nothing. */
export function instanceParameters(part: NetlistPart): string {
  const words = deckParameters(part.params ?? {});
  return words === '' ? '' : ` ${words}`;
}

/** Number of a quantity fact; undefined where it is absent or a deck wrote a word instead. */
export function numberOf(part: NetlistPart, fact: keyof NetlistPart['facts']): number | undefined {
  const value = part.facts[fact];
  return typeof value === 'number' ? value : undefined;
}

/** Deck half of a kind whose element is its main value between two pins (R, C, L). */
export function valueDeck(letter: 'R' | 'C' | 'L', pins: readonly [string, string], placeholder: number): KindDeck {
  return {
    letterOf: () => letter,
    pinOrder: pins,
    placeholder,
    read: (element) => element.letter === letter,
    write(part, name, node) {
      const model = part.model === undefined ? '' : ` ${part.model}`;
      const value = part.model !== undefined && numberOf(part, 'value') === undefined
        ? '' : ` ${deckNumber(numberOf(part, 'value') ?? placeholder)}`;
      return [`${name} ${nodesOf(part, pins, node)}${model}${value}${instanceParameters(part)}`];
    },
  };
}

/** Resistance that stands for a closed contact in a deck, ohms: small beside any circuit, never 0 (`docs/engine.md` 3.5). */
export const closedOhms = 1e-3;
/** Resistance that stands for an open contact in a deck, ohms (`docs/engine.md` 3.5). */
export const openOhms = 1e12;

/** Deck half of a kind that a deck draws as a small resistor: leads, contacts, switches, fuses. */
export function contactDeck(isClosed: (part: NetlistPart) => boolean): KindDeck {
  const pins = ['1', '2'];
  return {
    letterOf: () => 'R',
    pinOrder: pins,
    write(part, name, node) {
      const ohms = isClosed(part) ? (numberOf(part, 'rs') ?? closedOhms) : openOhms;
      return [`${name} ${nodesOf(part, pins, node)} ${deckNumber(ohms)}${instanceParameters(part)}`];
    },
  };
}

/** Deck half of a mark: it leaves no element. */
export const markDeck: KindDeck = { letterOf: () => null, pinOrder: [], write: () => [] };
