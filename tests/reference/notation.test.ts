import { describe, expect, test } from 'vitest';
import { nextDesignator } from '@/lib/netlist/designators/designator';
import { nextRevisionLetter, revisionLetter } from '@/lib/netlist/designators/revision-letter';
import { kindIds, type KindId } from '@/lib/netlist/kinds/kind-id';
import { kindOf } from '@/lib/netlist/kinds/kind-registry';
import { parseQuantity } from '@/lib/netlist/quantity/parse-quantity';
import { formatLetterCode, parseLetterCode } from '@/lib/netlist/quantity/rkm';
import { decadeOf, nearest, nearestUp } from '@/lib/netlist/series/preferred-values';

function ohms(text: string): number | undefined {
  const reading = parseQuantity(text, { unit: 'Ω' });
  return reading.ok ? reading.value : undefined;
}

describe('IEC 60062 letter code (as in copies of the "RKM code" encyclopedia article and tnlab.org)', () => {
  test.each([
    ['R47', 0.47], ['4R7', 4.7], ['470R', 470], ['4K7', 4_700], ['47K', 47_000], ['47K3', 47_300], ['470K', 470_000], ['4M7', 4.7e6],
    ['R10', 0.1], ['R300', 0.3], ['2M2', 2.2e6], ['33K', 33_000], ['2k2', 2_200], ['1K0', 1_000], ['1M0', 1e6], ['1R8J', 1.8], ['27KK', 27_000],
  ])('%s is %d Ω', (text, value) => { expect(ohms(text)).toBe(value); });

  test.each([['10p', 10e-12], ['4n7', 4.7e-9], ['1µ0', 1e-6], ['1\u03bc0', 1e-6]])('%s is %d F', (text, value) => {
    expect(parseQuantity(text, { unit: 'F' })).toEqual({ ok: true, value });
  });

  test.each([[0.47, 'R47'], [4.7, '4R7'], [470, '470R'], [4_700, '4K7'], [47_000, '47K'], [47_300, '47K3'], [470_000, '470K'], [4.7e6, '4M7'], [1_000, '1K0']])(
    '%d Ω is written %s', (value, text) => { expect(formatLetterCode(value, 'Ω')).toBe(text); });

  test.each([['1R8F', 1], ['1R8G', 2], ['1R8J', 5], ['27KK', 10]])('tolerance letter of %s is %d %% (probsee.com)', (text, tolerance) => {
    expect(parseLetterCode(text, 'Ω')?.tolerance).toBe(tolerance);
  });

  test('multiplier L is a thousandth of an ohm (probsee.com)', () => {
    expect(ohms('4L7')).toBe(0.0047);
  });
});

describe('IEC 60063 preferred values (table at qsl.net/g4usp)', () => {
  test('E6, E12 and E24', () => {
    expect(decadeOf('E6')).toEqual([1, 1.5, 2.2, 3.3, 4.7, 6.8]);
    expect(decadeOf('E12')).toEqual([1, 1.2, 1.5, 1.8, 2.2, 2.7, 3.3, 3.9, 4.7, 5.6, 6.8, 8.2]);
    expect(decadeOf('E24')).toEqual([1, 1.1, 1.2, 1.3, 1.5, 1.6, 1.8, 2, 2.2, 2.4, 2.7, 3, 3.3, 3.6, 3.9, 4.3, 4.7, 5.1, 5.6, 6.2, 6.8, 7.5, 8.2, 9.1]);
  });

  test('E48', () => {
    const table = `100 105 110 115 121 127 133 140 147 154 162 169 178 187 196 205 215 226 237 249 261 274 287 301 316 332 348 365 383 402 422 442 464
      487 511 536 562 590 619 649 681 715 750 787 825 866 909 953`;
    expect(decadeOf('E48')).toEqual(table.split(/\s+/).map((value) => Number(value) / 100));
  });

  test('E96 is E48 and the values between', () => {
    const between = `102 107 113 118 124 130 137 143 150 158 165 174 182 191 200 210 221 232 243 255 267 280 294 309 324 340 357 374 392 412 432 453 475
      499 523 549 576 604 634 665 698 732 768 806 845 887 931 976`;
    const all = [...decadeOf('E48'), ...between.split(/\s+/).map((value) => Number(value) / 100)].sort((a, b) => a - b);
    expect(decadeOf('E96')).toEqual(all);
  });

  test('next larger of 350, and the neighbour of 47 in E96', () => {
    expect([nearestUp(350, 'E12'), nearestUp(350, 'E24'), nearestUp(350, 'E96')]).toEqual([390, 360, 357]);
    expect([nearest(47, 'E96'), nearest(46.9, 'E96')]).toEqual([47.5, 46.4]);
  });
});

describe('class letters in everyday use (IEEE 315-1975 clause 22.4 with ASME Y14.44-2008)', () => {
  test.each<[string, KindId[]]>([
    ['R', ['resistor']], ['C', ['capacitor', 'polarised-capacitor']], ['L', ['inductor', 'air-core-coil']], ['D', ['diode', 'schottky', 'zener', 'led']],
    ['Q', ['nmos', 'pmos', 'npn', 'pnp']], ['F', ['fuse']], ['S', ['switch']], ['J', ['plug-contact']], ['W', ['removable-lead']], ['TP', ['test-point']],
  ])('%s', (letter, kinds) => { expect(kinds.map((kind) => kindOf(kind).letter)).toEqual(kinds.map(() => letter)); });

  test('every letter starts a designator', () => {
    const letters = kindIds.map((kind) => kindOf(kind).letter).filter((letter) => letter !== null);
    expect(letters.map((letter) => nextDesignator(letter, []))).toEqual(letters.map((letter) => `${letter}1`));
  });
});

describe('ASME Y14.35M-1997 revision letters: no I, O, Q, S, X, Z (fcsuper.com)', () => {
  test('the first twenty', () => {
    expect(Array.from({ length: 20 }, (_, index) => revisionLetter(index + 1)).join(' ')).toBe('A B C D E F G H J K L M N P R T U V W Y');
  });

  test.each([['H', 'J'], ['N', 'P'], ['P', 'R'], ['R', 'T'], ['W', 'Y'], ['Y', 'AA']])('after %s comes %s', (letter, next) => {
    expect(nextRevisionLetter(letter)).toBe(next);
  });
});
