import type { DeckElement, ModelCard, Subcircuit } from '../netlist';
import { deckNumber, deckParameters } from './deck-number';

/** A `.model` line of a card that a deck brought. */
export function cardLine({ name, type, params, flags }: ModelCard): string {
  const words = [...flags, deckParameters(params)].filter((word) => word !== '').join(' ');
  return `.model ${name} ${type.toUpperCase()}(${words})`;
}

/** An element of a subcircuit as it was read. */
export function elementLine({ letter, name, nodes, value, wave, model, params, text }: DeckElement): string {
  const isSource = letter === 'V' || letter === 'I';
  const words = [
    name, ...nodes, model,
    value === undefined ? undefined : `${isSource ? 'DC ' : ''}${deckNumber(value)}`,
    wave && `${wave.shape.toUpperCase()}(${wave.args.map(deckNumber).join(' ')})`,
    text, deckParameters(params),
  ];
  return words.filter((word) => word !== undefined && word !== '').join(' ');
}

/** A subcircuit with all that is inside it. */
export function subcircuitLines({ name, pins, elements, models, subcircuits }: Subcircuit): string[] {
  return [
    `.subckt ${name} ${pins.join(' ')}`,
    ...subcircuits.flatMap(subcircuitLines), ...models.map(cardLine), ...elements.map(elementLine),
    '.ends',
  ];
}
