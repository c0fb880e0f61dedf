import { describe, expect, test } from 'vitest';
import { parseQuantity } from './parse-quantity';

const resistor = { unit: 'Ω', subject: 'a resistor', min: 0, max: 1e12 };

function value(text: string, unit: string): number {
  const reading = parseQuantity(text, { unit });
  if (!reading.ok) throw new Error(reading.reason);
  return reading.value;
}

function reason(text: string, expected: Parameters<typeof parseQuantity>[1] = resistor): string {
  const reading = parseQuantity(text, expected);
  return reading.ok ? `read as ${reading.value}` : reading.reason;
}

describe('what people type', () => {
  test.each([
    ['4k7', 'Ω', 4_700], ['4.7 kΩ', 'Ω', 4_700], ['4,7 kΩ', 'Ω', 4_700], ['4.7\u2009kΩ', 'Ω', 4_700], ['4.7\u00a0k\u2126', 'Ω', 4_700],
    ['470R', 'Ω', 470], ['470 ohm', 'Ω', 470], ['33000', 'Ω', 33_000], ['10 000', 'Ω', 10_000], ['1M', 'Ω', 1e6], ['1 Meg', 'Ω', 1e6],
    ['1m', 'Ω', 1e-3], ['1e3', 'Ω', 1_000], ['2K2', 'Ω', 2_200], ['.5', 'Ω', 0.5], ['1.500', 'Ω', 1.5], ['0,250', 'Ω', 0.25],
    ['10n', 'F', 10e-9], ['10nf', 'F', 10e-9], ['100 µF', 'F', 100e-6], ['100 \u03bcF', 'F', 100e-6], ['100uF', 'F', 100e-6], ['1F0', 'F', 1],
    ['0.25 W', 'W', 0.25], ['0,25W', 'W', 0.25], ['250 mW', 'W', 0.25], ['12', 'V', 12], ['3V3', 'V', 3.3], ['\u22125 V', 'V', -5],
    ['25 kHz', 'Hz', 25_000], ['25k', 'Hz', 25_000], ['20ma', 'A', 0.02], ['71 nC', 'C', 71e-9], ['62 K/W', 'K/W', 62], ['5 %', '%', 5],
    ['１２ V', 'V', 12], ['4k7 Ω', 'Ω', 4_700], ['4k7ohms', 'Ω', 4_700], ['4n7 F', 'F', 4.7e-9], ['2u2H', 'H', 2.2e-6], ['1e-9', 's', 1e-9],
  ])('%s in %s', (text, unit, expected) => {
    expect(value(text, unit)).toBe(expected);
  });

  test('a tolerance letter comes along', () => {
    expect(parseQuantity('27KK', resistor)).toEqual({ ok: true, value: 27_000, tolerance: 10 });
  });
});

describe('refusals say what is wrong and what is wanted', () => {
  test.each([
    ['33 kV', 'kV is a voltage; a resistor wants ohms: 33k, 33 kΩ or 33000.'],
    ['10 nF', 'nF is a capacitance; a resistor wants ohms: 4k7, 4.7 kΩ or 4700.'],
    ['3V3', '3V3 is a voltage; a resistor wants ohms: 4k7, 4.7 kΩ or 4700.'],
    ['1,500', '1,500 is unclear: it is 1500 to some and 1.500 to others. Write 1500 or 1.500.'],
    ['1,234.5', '1,234.5 has more than one decimal mark; write it without marks between thousands.'],
    ['4 7', '4 7 reads as two numbers; write it without a space between digits.'],
    ['', 'Nothing is typed; a resistor wants ohms: 4k7, 4.7 kΩ or 4700.'],
    ['NaN', '“NaN” is not a number; a resistor wants ohms: 4k7, 4.7 kΩ or 4700.'],
    ['Infinity', '“Infinity” is not a number; a resistor wants ohms: 4k7, 4.7 kΩ or 4700.'],
    ['4k7x9', '“k7x9” after 4 is not understood; a resistor wants ohms: 4k7, 4.7 kΩ or 4700.'],
    ['-10', 'A resistance here cannot be negative; a resistor wants ohms: 4k7, 4.7 kΩ or 4700.'],
    ['1e13', '10\u2009TΩ is above what is possible here: at most 1\u2009TΩ.'],
    ['1e400', 'That number is too large; a resistor wants ohms: 4k7, 4.7 kΩ or 4700.'],
    ['lots', '“lots” is not a number; a resistor wants ohms: 4k7, 4.7 kΩ or 4700.'],
  ])('%s', (text, expected) => {
    expect(reason(text)).toBe(expected);
  });

  test('a value under the bound', () => {
    expect(reason('0.1', { unit: 'V', min: 0.5 })).toBe('100\u2009mV is below what is possible here: at least 500\u2009mV.');
  });

  test('femto or farad is not guessed, nor milli or mega in mhz', () => {
    expect(reason('10f', { unit: 'F' })).toContain('not understood');
    expect(reason('25 mhz', { unit: 'Hz' })).toContain('not understood');
  });

  test('a text without end answers at once', () => {
    expect(reason('9'.repeat(100_000))).toContain('too long');
  });
});
