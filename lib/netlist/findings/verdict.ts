import type { Evidence } from './finding';

/** Quantities that must reach their limit; every other quantity must not pass it. */
const lowerBounded: ReadonlySet<string> = new Set([
  'DC paths', 'clamps', 'series resistors', 'pins on the net', 'values given', 'gate drive', 'differing characters', 'headroom', 'fields filled', 'series members',
]);

/** Whether one piece of evidence, taken alone, breaks the limit it names. Evidence without a limit breaks nothing. */
export function breaksLimit({ quantity, value, limit }: Evidence): boolean {
  if (limit === undefined || typeof value !== 'number') return false;
  return lowerBounded.has(quantity) ? value < limit : value > limit;
}

/** The verdict computed again from evidence alone: something breaks its limit. */
export const failsByEvidence = (evidence: readonly Evidence[]): boolean => evidence.some(breaksLimit);
