import type { ModelCard } from '../netlist';

/**
 * A number as the engine is given it. Never in the words of a person: `1M` would be a milliohm to it.
 * @throws RangeError for NaN or an infinity, which no deck can carry.
 */
export function engineNumber(value: number): string {
  if (!Number.isFinite(value)) throw new RangeError(`${value} cannot stand in a deck`);
  return value.toExponential(9);
}

/** A `.model` line under a generated name. */
export function modelLine(name: string, card: Omit<ModelCard, 'name'>): string {
  const params = Object.entries(card.params).map(([key, value]) => `${key}=${engineNumber(value)}`);
  return `.model ${name} ${card.type}(${[...card.flags, ...params].join(' ')})`;
}
