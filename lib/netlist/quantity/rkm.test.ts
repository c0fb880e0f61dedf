import { describe, expect, test } from 'vitest';
import { formatLetterCode, parseLetterCode } from './rkm';

describe('letter code', () => {
  test.each([[0.47, 'R47'], [0.1, 'R10'], [0.3, 'R30'], [4.7, '4R7'], [470, '470R'], [4_700, '4K7'], [47_000, '47K'], [1_000, '1K0'],
    [1e6, '1M0'], [4.7e6, '4M7'], [47_300, '47K3'], [0.01, '10L'], [0.0047, '4L7'], [999.999_999_99, '1K0']])('%d Ω is %s', (ohms, text) => {
    expect(formatLetterCode(ohms, 'Ω')).toBe(text);
  });

  test.each([[10e-12, '10p'], [4.7e-9, '4n7'], [1e-6, '1µ0'], [2_200e-6, '2m2']])('%d F is %s', (farads, text) => {
    expect(formatLetterCode(farads, 'F')).toBe(text);
  });

  test('no code for zero, a negative or an endless value', () => {
    expect([0, -1, Infinity, NaN].map((value) => formatLetterCode(value, 'Ω'))).toEqual([undefined, undefined, undefined, undefined]);
  });

  test('reads back what it writes over twelve decades', () => {
    for (let exponent = -1; exponent < 10; exponent++) {
      for (const digits of [1, 1.5, 4.7, 8.2]) {
        const ohms = Number(`${digits}e${exponent}`);
        const text = formatLetterCode(ohms, 'Ω') as string;
        const read = parseLetterCode(text, 'Ω')?.value ?? Number(text.replace(/[RKMG]$/, (mark) => ({ R: 'e0', K: 'e3', M: 'e6', G: 'e9' })[mark] as string));
        expect(read).toBe(ohms);
      }
    }
  });
});
