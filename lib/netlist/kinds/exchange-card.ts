import { modelLine } from '../deck/deck-number';
import type { FittedModel, ModelResult } from '../models/fitted-model';
import type { NetlistPart } from '../netlist';
import { instanceParameters, nodesOf } from './element-line';
import type { KindDeck } from './kind';

interface CardedKind {
  readonly letter: 'D' | 'Q';
  /** Pins of the part in the order of the element's nodes. */
  readonly pins: readonly string[];
  /** End of the card's name: `D1_LED`. */
  readonly suffix: string;
  /** The engine's own model of the part at the middle of its corners. */
  modelOf(part: NetlistPart): ModelResult;
  /** Stands where a fact without which there is no model is missing; the element must have a card. */
  readonly stand: FittedModel['card'];
  readonly read?: KindDeck['read'];
}

/** Significant digits of a card: far finer than any data sheet, short enough to read. */
const cardDigits = 7;

/**
 * Deck half of a diode or bipolar transistor: the element and a card made from its ratings, `D1 a k D1_LED`. A part with a card
 * of its own keeps it.
 */
export function cardedDeck(kind: CardedKind): KindDeck {
  return {
    letterOf: () => kind.letter,
    pinOrder: kind.pins,
    ...(kind.read ? { read: kind.read } : {}),
    write(part, name, node) {
      const card = part.model ?? `${name}_${kind.suffix}`;
      const element = `${name} ${nodesOf(part, kind.pins, node)} ${card}${instanceParameters(part)}`;
      if (part.model !== undefined) return [element];
      const model = kind.modelOf(part);
      const { type, params } = 'card' in model ? model.card : kind.stand;
      const rounded = Object.entries(params).map(([key, value]) => [key, Number(value.toPrecision(cardDigits))]);
      return [element, modelLine(card, type, Object.fromEntries(rounded))];
    },
  };
}
