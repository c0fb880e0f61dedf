import { expect, test } from 'vitest';
import { editableQuantity, formatQuantity } from './format-quantity';
import { parseQuantity } from './parse-quantity';

test.each([
  [4_700, 'Ω', '4.7\u2009kΩ'], [0.01, 'A', '10\u2009mA'], [0, 'V', '0\u2009V'], [999.96, 'Ω', '1\u2009kΩ'], [325.269, 'V', '325.3\u2009V'],
  [4.7e-9, 'F', '4.7\u2009nF'], [1e-15, 'C', '1\u2009fC'], [-0.7, 'V', '−700\u2009mV'], [25, '°C', '25\u2009°C'], [62.5, 'K/W', '62.5\u2009K/W'],
  [0.05, '%', '0.05\u2009%'], [110, '', '110'], [2.2e16, 'Ω', '2.2e16\u2009Ω'],
])('%d %s', (value, unit, text) => {
  expect(formatQuantity(value, unit)).toBe(text);
});

test('leaving a field as it stands keeps the number', () => {
  for (const value of [4_700, 1 / 3, 12.345678901, 4.7e-9, 2.5e-4, -0.7]) {
    expect(parseQuantity(editableQuantity(value, 'V'), { unit: 'V' })).toEqual({ ok: true, value });
  }
});

test('numbers that are none', () => {
  expect(formatQuantity(NaN, 'V')).toBe('not a number');
  expect(formatQuantity(Infinity, 'V')).toBe('beyond all bounds');
});
