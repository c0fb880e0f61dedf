import { expect, test } from 'vitest';
import { breaksLimit } from './verdict';

const evidence = (quantity: string, value: number | string | boolean, limit?: number) =>
  ({ entity: 'R1', quantity, value, unit: '', source: '', ...(limit === undefined ? {} : { limit }) });

test('a stress breaks its limit above it, never at it', () => {
  expect(breaksLimit(evidence('power', 0.25, 0.25))).toBe(false);
  expect(breaksLimit(evidence('power', 0.2501, 0.25))).toBe(true);
});

test('what must be there breaks its limit below it', () => {
  expect(breaksLimit(evidence('DC paths', 0, 1))).toBe(true);
  expect(breaksLimit(evidence('gate drive', 4.5, 4.5))).toBe(false);
});

test('something that is not given speaks by itself; a number without a limit does not', () => {
  expect(breaksLimit(evidence('pmax', false))).toBe(true);
  expect(breaksLimit(evidence('crossing', 19.3))).toBe(false);
});
