/**
 * A number as a deck carries it: the shortest decimals that read back as the same number, without a scale suffix.
 * Throws on NaN and infinities, which no deck can carry.
 */
export function deckNumber(value: number): string {
  if (!Number.isFinite(value)) throw new RangeError('A deck cannot carry a number that is not finite');
  return String(value).replace('e+', 'e');
}

/** `KEY=1` pairs in the given order, those without a value left out. */
export function deckParameters(parameters: Readonly<Record<string, number | undefined>>): string {
  return Object.entries(parameters)
    .flatMap(([key, value]) => (value === undefined ? [] : [`${key.toUpperCase()}=${deckNumber(value)}`]))
    .join(' ');
}

/** A `.model` line. */
export function modelLine(name: string, type: string, parameters: Readonly<Record<string, number | undefined>>): string {
  return `.model ${name} ${type.toUpperCase()}(${deckParameters(parameters)})`;
}
