import { prefixExponent, scaled } from './prefix';
import { unitOf } from './unit';

/** Tolerance letters of IEC 60062, per cent. */
const tolerances: Readonly<Record<string, number>> = { B: 0.1, C: 0.25, D: 0.5, F: 1, G: 2, J: 5, K: 10, M: 20 };

/** A value in the letter code of IEC 60062: the multiplier stands where the decimal mark would. */
export interface LetterCode {
  /** SI units. */
  readonly value: number;
  /** Per cent, when the code ends in a tolerance letter. */
  readonly tolerance?: number;
}

const shape = /^([0-9]*)([A-Za-zµμ])([0-9]+)([A-Z]?)$|^([0-9]+)([A-Za-zµμ])([A-Z])$/;

/**
 * Reads `4K7`, `R47`, `2k2`, `4n7`, `1R8J`, `27KK`. Codes without a digit after the letter and without a tolerance
 * (`47K`) read as an ordinary number with a prefix and are not taken here. L is milli for ohms.
 * A final letter that names the unit (`4n7F`) is the unit.
 */
export function parseLetterCode(text: string, unit: string): LetterCode | undefined {
  const match = shape.exec(text);
  if (!match) return undefined;
  const whole = match[1] ?? match[5] ?? '';
  const letter = match[2] ?? match[6] ?? '';
  const fraction = match[3] ?? '';
  const end = match[4] || match[7] || '';
  const exponent = markExponent(letter, unit, whole);
  if (exponent === undefined) return undefined;
  const value = scaled(`${whole || '0'}.${fraction || '0'}`, exponent);
  if (end === '' || end === unit) return { value };
  const tolerance = tolerances[end];
  return tolerance === undefined ? undefined : { value, tolerance };
}

function markExponent(letter: string, unit: string, whole: string): number | undefined {
  if (unitOf(unit).mark.includes(letter)) return 0;
  if (unit === 'Ω' && letter === 'r') return 0;
  if (unit === 'Ω' && letter === 'L') return -3;
  return whole === '' ? undefined : prefixExponent(letter);
}

const ohmMarks: readonly (readonly [number, string])[] = [[9, 'G'], [6, 'M'], [3, 'K'], [0, 'R'], [-3, 'L']];
const otherMarks: readonly (readonly [number, string])[] = [[0, ''], [-3, 'm'], [-6, 'µ'], [-9, 'n'], [-12, 'p']];

/**
 * Writes a positive value in the letter code of IEC 60062 with at least two digits: `4K7`, `470R`, `R47`, `1µ0`.
 * For ohms, farads and henries; undefined for zero, negatives and units without such a code.
 */
export function formatLetterCode(value: number, unit: 'Ω' | 'F' | 'H'): string | undefined {
  if (!(value > 0) || !Number.isFinite(value)) return undefined;
  const marks = unit === 'Ω' ? ohmMarks : otherMarks;
  if (unit === 'Ω' && value < 1 && value >= 0.1) return `R${decimals(value).slice(2).padEnd(2, '0')}`;
  const [exponent, mark] = marks.find(([power]) => value >= 0.999_999_9 * 10 ** power) ?? (marks.at(-1) as readonly [number, string]);
  const letter = mark === '' ? unit : mark;
  const [whole = '0', fraction = ''] = decimals(Number(scaled(String(value), -exponent).toPrecision(9))).split('.');
  const padded = whole.length === 1 && fraction === '' ? '0' : fraction;
  return `${whole}${letter}${padded}`;
}

function decimals(value: number): string {
  return value.toFixed(9).replace(/0+$/, '').replace(/\.$/, '');
}
