import { expect, test } from 'vitest';
import { nextRevisionLetter, revisionLetter, revisionNumber } from './revision-letter';

test.each([[null, 'A'], ['A', 'B'], ['H', 'J'], ['N', 'P'], ['P', 'R'], ['R', 'T'], ['W', 'Y'], ['Y', 'AA'], ['AY', 'BA'], ['YY', 'AAA']])(
  'ASME Y14.35: after %s comes %s', (letter, next) => { expect(nextRevisionLetter(letter)).toBe(next); });

test('letter and number answer each other', () => {
  for (let number = 1; number < 500; number++) expect(revisionNumber(revisionLetter(number))).toBe(number);
});

test('letters that the standard leaves out are refused', () => {
  expect(() => nextRevisionLetter('O')).toThrow('O is no revision letter');
  expect(() => nextRevisionLetter('')).toThrow(RangeError);
  expect(() => revisionLetter(0)).toThrow(RangeError);
});
