import { describe, expect, test } from 'vitest';
import { numberRefusal, spiceNumber } from './spice-number';

describe('numbers as every SPICE reads them', () => {
  test.each([
    ['1k', 1e3], ['1M', 1e-3], ['1MEG', 1e6], ['1meg', 1e6], ['1megohm', 1e6], ['1Mohm', 1e-3], ['1F', 1e-15], ['10uF', 10e-6], ['100nF', 100e-9],
    ['4.7k', 4.7e3], ['1e3', 1e3], ['1e-9', 1e-9], ['1.5e3k', 1.5e6], ['.5', 0.5], ['5.', 5], ['-12', -12], ['+3', 3], ['1mil', 25.4 * 1e-6],
    ['2t', 2e12], ['3g', 3e9], ['20mA', 20e-3], ['50Hz', 50], ['10ns', 10e-9], ['0.25W', 0.25], ['12V', 12], ['1h', 1], ['1ohm', 1],
  ])('%s', (text, value) => { expect(spiceNumber(text)).toBe(value); });

  test.each(['4k7', '4R7', '4k7x9', '1,5k', '10µF', '1kk', '1kfoo', '', 'k', '1e', '--1', '1e99999', '0x10', 'NaN', 'Infinity', '10ohms', '1 k'])(
    '%s is none', (text) => { expect(spiceNumber(text)).toBeUndefined(); });
});

test.each([
  ['4k7', '4k7 is not a number in a deck; write 4.7k.'],
  ['4R7', '4R7 is not a number in a deck; write 4.7.'],
  ['1,5k', '1,5k has a comma; a deck takes a point: 1.5k.'],
  ['10µF', '10µF is not a number in a deck; write u for micro: 10uF.'],
  ['4k7x9', '4k7x9 is not a number.'],
])('a known slip is told how to be written: %s', (text, words) => { expect(numberRefusal(text)).toBe(words); });
