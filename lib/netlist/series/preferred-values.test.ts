import { describe, expect, test } from 'vitest';
import { decadeOf, isPreferred, nearest, nearestUp, neighbours, type SeriesName } from './preferred-values';

test.each([['E6', 6], ['E12', 12], ['E24', 24], ['E48', 48], ['E96', 96]] as const)('%s has its count of values', (series, count) => {
  expect(new Set(decadeOf(series)).size).toBe(count);
});

test('nesting', () => {
  const inside = (small: SeriesName, large: SeriesName) => decadeOf(small).every((value) => decadeOf(large).includes(value));
  expect([inside('E6', 'E12'), inside('E12', 'E24'), inside('E48', 'E96'), inside('E24', 'E96')]).toEqual([true, true, true, false]);
});

describe('nearest', () => {
  test.each([[22_001, 'E12', 22_000], [350, 'E24', 360], [47, 'E96', 47.5], [11, 'E12', 12], [0.99, 'E6', 1], [9.7e-9, 'E12', 10e-9]] as const)(
    '%d in %s is %d', (value, series, expected) => { expect(nearest(value, series)).toBe(expected); });

  test('up never answers less, at any decade', () => {
    for (let value = 1e-12; value < 1e9; value *= 1.7) {
      const up = nearestUp(value, 'E24');
      expect(up).toBeGreaterThanOrEqual(value * (1 - 1e-9));
      expect(up).toBeLessThan(value * 1.21);
    }
  });

  test('a value of the series is its own neighbour, also when computed', () => {
    expect(neighbours(4_700, 'E12')).toEqual([4_700, 4_700]);
    expect(isPreferred(47 * 1e2 * 1.000_000_000_01, 'E12')).toBe(true);
    expect(isPreferred(1_000, 'E96')).toBe(true);
    expect(isPreferred(4_800, 'E24')).toBe(false);
  });

  test('zero and negatives have none', () => {
    expect(() => neighbours(0, 'E12')).toThrow(RangeError);
    expect(() => neighbours(-1, 'E12')).toThrow(RangeError);
  });
});
