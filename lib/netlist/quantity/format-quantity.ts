import { printedPrefixes, scaled } from './prefix';
import { unitOf } from './unit';

/** Thin space between number and unit. */
export const thinSpace = '\u2009';

/**
 * Engineering notation with a thin space: `4.7 kΩ`, `10 mA`, `0 V`. At most `digits` significant digits, trailing zeros
 * dropped. Units that take no prefix (`°C`, `K/W`, `%`) keep the plain number; values past the prefixes get a power of ten.
 */
export function formatQuantity(value: number, unit: string, digits = 4): string {
  if (!Number.isFinite(value)) return Number.isNaN(value) ? 'not a number' : 'beyond all bounds';
  const { prefixed } = unitOf(unit);
  const prefixable = prefixed && unit !== '';
  const exponent = value === 0 || !prefixable ? 0 : engineeringExponent(value, digits);
  const prefix = printedPrefixes.get(exponent);
  const tail = prefix === undefined ? unit : `${prefix}${unit}`;
  const number = prefix === undefined ? value.toExponential(Math.max(digits - 1, 0)).replace(/\.?0+e/, 'e').replace('e+', 'e')
    : significant(scaled(String(value), -exponent), digits);
  return tail === '' ? number : `${number}${thinSpace}${tail}`;
}

/** Multiple of three such that the rounded number lies in 1 … 999.9. */
function engineeringExponent(value: number, digits: number): number {
  const power = Number(Math.abs(value).toExponential(Math.max(digits - 1, 0)).split('e')[1]);
  return Math.floor(power / 3) * 3;
}

/** Up to `digits` significant digits without an exponent and without trailing zeros; a real minus sign. */
function significant(value: number, digits: number): string {
  const text = Number(value.toPrecision(digits)).toString();
  return text.startsWith('-') ? `−${text.slice(1)}` : text;
}

/** A quantity as it stands in a field being edited: all digits of the number, so that leaving it alone changes nothing. */
export function editableQuantity(value: number, unit: string): string {
  return formatQuantity(value, unit, 17);
}
