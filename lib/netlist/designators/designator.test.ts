import { expect, test } from 'vitest';
import { compareDesignators, nextDesignator, splitDesignator } from './designator';

test('natural order', () => {
  expect(['R10', 'Q1', 'R2', 'r2', 'C3', 'R2A', 'R02', 'R'].sort(compareDesignators)).toEqual(['C3', 'Q1', 'R', 'R2', 'r2', 'R2A', 'R02', 'R10']);
});

test('natural order is total', () => {
  const refs = ['R1', 'R01', 'r1', 'R1B', 'R1a', '1', '', 'Ω1', 'R1 2'];
  for (const a of refs) for (const b of refs) expect(Math.sign(compareDesignators(a, b))).toBe(-Math.sign(compareDesignators(b, a)) + 0);
});

test('the lowest free number of a class letter', () => {
  expect(nextDesignator('R', ['R1', 'r2', 'R4', 'C3'])).toBe('R3');
  expect(nextDesignator('TP', [])).toBe('TP1');
});

test('letters and number', () => {
  expect(splitDesignator('TP12')).toEqual({ letters: 'TP', number: 12 });
  expect([splitDesignator('R'), splitDesignator('12'), splitDesignator('R1A')]).toEqual([undefined, undefined, undefined]);
});
