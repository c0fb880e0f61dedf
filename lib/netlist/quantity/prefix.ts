/** SI prefixes as people type them. `K` is read as kilo; `meg` is what simulator users write for mega. */
const prefixExponents: Readonly<Record<string, number>> = {
  T: 12, G: 9, M: 6, meg: 6, Meg: 6, MEG: 6, k: 3, K: 3, m: -3, u: -6, 'µ': -6, 'μ': -6, n: -9, p: -12,
};

/** Power of ten of a prefix, or undefined for anything that is none. */
export function prefixExponent(prefix: string): number | undefined {
  return Object.hasOwn(prefixExponents, prefix) ? prefixExponents[prefix] : undefined;
}

/** Prefixes in the order they are tried at the head of a unit, longest first. */
export const prefixes: readonly string[] = Object.keys(prefixExponents).sort((a, b) => b.length - a.length);

/** Printed prefixes by power of ten. */
export const printedPrefixes: ReadonlyMap<number, string> = new Map([
  [12, 'T'], [9, 'G'], [6, 'M'], [3, 'k'], [0, ''], [-3, 'm'], [-6, 'µ'], [-9, 'n'], [-12, 'p'], [-15, 'f'],
]);

/** `digits × 10^exponent`, correctly rounded: 4.7 with exponent -9 is the double nearest 4.7e-9. */
export function scaled(digits: string, exponent: number): number {
  const [mantissa, own = '0'] = digits.toLowerCase().split('e');
  return Number(`${mantissa}e${Number(own) + exponent}`);
}
