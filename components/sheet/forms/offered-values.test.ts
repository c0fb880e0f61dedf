import { expect, it } from 'vitest';
import { offeredValues } from './offered-values';

it('offers the values of the series round what was meant, also with the wrong unit', () => {
  expect(offeredValues('33 kV', 1_200, 'E24')).toEqual([30_000, 33_000, 36_000]);
  expect(offeredValues('34k', undefined, 'E24')).toEqual([33_000, 36_000]);
  expect(offeredValues('', 1_200, 'E24')).toEqual([1_100, 1_200, 1_300]);
  expect(offeredValues('ohms', undefined, 'E24')).toEqual([]);
});
