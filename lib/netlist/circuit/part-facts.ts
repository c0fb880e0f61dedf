import type { FactKey } from '../facts/fact-registry';
import type { NetlistPart } from '../netlist';

/** A quantity fact in SI units, undefined when absent or no finite number. */
export function quantityOf(part: NetlistPart, key: FactKey): number | undefined {
  const value = part.facts[key];
  return typeof value === 'number' && Number.isFinite(value) ? value : undefined;
}

/** A rating by its magnitude: P-channel and PNP sheets print theirs with a minus. */
export function magnitudeOf(part: NetlistPart, key: FactKey): number | undefined {
  const value = quantityOf(part, key);
  return value === undefined ? undefined : Math.abs(value);
}

/** A label fact, lower case; undefined when absent. */
export function labelOf(part: NetlistPart, key: FactKey): string | undefined {
  const value = part.facts[key];
  return typeof value === 'string' && value !== '' ? value.toLowerCase() : undefined;
}

/** A flag fact. A number says yes and how much (`fuse=2`). */
export function isYes(part: NetlistPart, key: FactKey): boolean {
  const value = part.facts[key];
  return value === true || (typeof value === 'number' && value !== 0) || value === 'yes';
}

/** Where a fact comes from, in the words that evidence carries. */
export function originOf(part: NetlistPart, key: FactKey): string {
  return part.origins[key] ?? 'typed';
}
