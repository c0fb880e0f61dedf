import type { FactKey } from '../facts/fact-registry';
import type { Facts } from '../netlist';

/**
 * Magnitude of a number fact, undefined when it is absent or no finite number above zero. P-channel and PNP sheets print
 * minus signs; the sign follows from the kind.
 */
export function magnitude(facts: Facts, key: FactKey): number | undefined {
  const value = facts[key];
  if (typeof value !== 'number' || !Number.isFinite(value) || value === 0) return undefined;
  return Math.abs(value);
}
