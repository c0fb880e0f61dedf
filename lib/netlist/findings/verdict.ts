import type { Evidence } from './finding';

/** Quantities that must reach their limit; every other quantity must not pass it. */
const lowerBounded: ReadonlySet<string> = new Set([
  'DC paths', 'clamps', 'series resistors', 'pins', 'gate drive', 'fields filled',
]);

/**
 * Whether one piece of evidence, taken alone, speaks against the circuit: a number past the limit it names, or something
 * that should be there and is not (`false`, or no words). A number without a limit breaks nothing.
 */
export function breaksLimit({ quantity, value, limit }: Evidence): boolean {
  if (value === false || value === '') return true;
  if (limit === undefined || typeof value !== 'number') return false;
  return lowerBounded.has(quantity) ? value < limit : value > limit;
}

/** The verdict computed again from evidence alone: something breaks its limit. */
export const failsByEvidence = (evidence: readonly Evidence[]): boolean => evidence.some(breaksLimit);
