import { expect, test } from 'vitest';
import { isSourceTouchSafe, isTouchSafe } from './touch-safe';

/** Boundary checks of `docs/sources.md` 2 (IEC 62368-1:2018 Table 4, ES1). */
test.each([
  [60, true], [60.1, false], [48, true], [120, false], [325, false],
])('%d V DC: touch-safe %s', (volts, safe) => {
  expect(isSourceTouchSafe(volts, false)).toBe(safe);
});

test.each([[30, true], [30.1, false], [230, false], [12, true]])('%d V rms sine: touch-safe %s', (volts, safe) => {
  expect(isSourceTouchSafe(volts, true)).toBe(safe);
});

test('smooth means less than 10 % ripple; anything rougher goes by its peak', () => {
  expect(isTouchSafe({ mean: 55, peak: 57.4, ripple: 0.0999 })).toBe(true);
  expect(isTouchSafe({ mean: 55, peak: 57.7, ripple: 0.1 })).toBe(false);
  expect(isTouchSafe({ mean: 38, peak: 42.4, ripple: 0.2 })).toBe(true);
});
