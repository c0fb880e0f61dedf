import { formatQuantity } from './format-quantity';
import { prefixes, prefixExponent, scaled } from './prefix';
import { parseLetterCode } from './rkm';
import { foldTyped, headNumber, maxQuantityLength } from './typed-text';
import { spells, unitOf, units, type UnitDefinition } from './unit';

/** What a field wants. */
export interface ExpectedQuantity {
  /** Printed unit symbol of the fact registry. */
  readonly unit: string;
  /** Who wants it, for refusals: 'a resistor'. */
  readonly subject?: string;
  /** Inclusive bounds, SI units. */
  readonly min?: number;
  readonly max?: number;
}

export type QuantityReading =
  /** `tolerance` is in per cent, from the last letter of an IEC 60062 code. */
  | { readonly ok: true; readonly value: number; readonly tolerance?: number }
  /** What is wrong and what is wanted, in words for the person who typed. */
  | { readonly ok: false; readonly reason: string };

/**
 * Reads a quantity as people write it: `4k7`, `4.7 kΩ`, `10n`, `0,25 W`, `1e-9`, `3V3`, `10 000`. The unit may be left
 * out; another unit is refused. Answers SI units.
 */
export function parseQuantity(typed: string, expected: ExpectedQuantity): QuantityReading {
  const unit = unitOf(expected.unit);
  const text = foldTyped(typed);
  if (text === '') return refuse(`Nothing is typed; ${wants(unit, expected)}`);
  if (text.length > maxQuantityLength) return refuse(`That is too long to be a quantity; ${wants(unit, expected)}`);
  const code = parseLetterCode(text, unit.symbol) ?? parseLetterCode(withoutUnit(text, unit), unit.symbol);
  if (code) return bounded(code, unit, expected);
  const number = headNumber(text);
  if (number.kind === 'unclear') return refuse(`${number.why}.`);
  if (number.kind === 'none') return refuse(`${quote(text)} is not a number; ${wants(unit, expected)}`);
  const tail = readTail(number.rest, unit);
  if (typeof tail === 'number') return bounded({ value: scaled(number.digits, tail) }, unit, expected);
  return refuse(foreignTail(number.rest, number.digits, unit, expected));
}

/** `4k7` of `4k7 Ω`: the text up to a unit that follows a digit. */
function withoutUnit(text: string, unit: UnitDefinition): string {
  const spelling = [unit.symbol, ...unit.spellings].find((word) => word !== '' && text.toLowerCase().endsWith(word.toLowerCase()));
  const bare = spelling === undefined ? text : text.slice(0, -spelling.length).trimEnd();
  return /[0-9]$/.test(bare) ? bare : text;
}

/** Power of ten that prefix and unit at the end of a quantity stand for; undefined when they are not of this unit. */
function readTail(rest: string, unit: UnitDefinition): number | undefined {
  if (rest === '' || spells(unit, rest)) return 0;
  if (!unit.prefixed) return undefined;
  for (const prefix of prefixes) {
    if (!rest.startsWith(prefix)) continue;
    const after = rest.slice(prefix.length).trimStart();
    const megaOrMilli = prefix === 'm' && unit.symbol === 'Hz' && after !== 'Hz' && after !== '';
    if (!megaOrMilli && (after === '' || spells(unit, after, true))) return prefixExponent(prefix);
  }
  return undefined;
}

function foreignTail(rest: string, digits: string, unit: UnitDefinition, expected: ExpectedQuantity): string {
  const others = Object.values(units).filter((candidate) => candidate !== unit && candidate.symbol !== '');
  const other = others.find((candidate) => endsInUnit(rest, candidate) && readTail(rest, candidate) !== undefined);
  if (other) return `${rest} is ${other.noun}; ${wants(unit, expected, digits, rest)}`;
  const inside = others.find((candidate) => candidate.mark.some((mark) => rest.startsWith(mark)) && /[0-9]$/.test(rest));
  if (inside) return `${digits}${rest} is ${inside.noun}; ${wants(unit, expected)}`;
  return `${quote(rest)} after ${digits} is not understood; ${wants(unit, expected)}`;
}

/** Whether the tail names the unit, not just a prefix. */
function endsInUnit(rest: string, unit: UnitDefinition): boolean {
  return [unit.symbol, ...unit.spellings].some((spelling) => rest.toLowerCase().endsWith(spelling.toLowerCase()));
}

/** 'a resistor wants ohms: 33k, 33 kΩ or 33000', with the person's own number where the prefix goes with it. */
function wants(unit: UnitDefinition, expected: ExpectedQuantity, digits?: string, rest = ''): string {
  return `${expected.subject ?? 'this field'} wants ${unit.plural}: ${ownExamples(unit, digits, rest) ?? unit.examples}.`;
}

function ownExamples(unit: UnitDefinition, digits: string | undefined, rest: string): string | undefined {
  const prefix = prefixes.find((candidate) => rest.startsWith(candidate) && rest.length > candidate.length);
  if (digits === undefined || digits.startsWith('-') || /e/i.test(digits) || prefix === undefined || !unit.prefixed || unit.symbol === '') return undefined;
  const exponent = prefixExponent(prefix) as number;
  return exponent < 0 ? undefined : `${digits}${prefix}, ${digits} ${prefix}${unit.symbol} or ${scaled(digits, exponent)}`;
}

function bounded(reading: { value: number; tolerance?: number }, unit: UnitDefinition, expected: ExpectedQuantity): QuantityReading {
  const { value } = reading;
  const { min = -Number.MAX_VALUE, max = Number.MAX_VALUE } = expected;
  if (!Number.isFinite(value)) return refuse(`That number is too large; ${wants(unit, expected)}`);
  if (value < 0 && min >= 0) return refuse(`${capital(unit.noun)} here cannot be negative; ${wants(unit, expected)}`);
  if (value < min) return refuse(`${formatQuantity(value, unit.symbol)} is below what is possible here: at least ${formatQuantity(min, unit.symbol)}.`);
  if (value > max) return refuse(`${formatQuantity(value, unit.symbol)} is above what is possible here: at most ${formatQuantity(max, unit.symbol)}.`);
  return { ok: true, ...reading, value: value === 0 ? 0 : value };
}

function refuse(reason: string): QuantityReading {
  return { ok: false, reason };
}

function quote(text: string): string {
  return `“${text.length > 20 ? `${text.slice(0, 20)}…` : text}”`;
}

function capital(words: string): string {
  return words.charAt(0).toUpperCase() + words.slice(1);
}
