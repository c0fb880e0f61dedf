import type { FactKey } from '../../facts/fact-registry';
import { originOf, magnitudeOf, labelOf } from '../../circuit/part-facts';
import type { NetlistPart } from '../../netlist';

/** A rating in SI units and where it comes from. */
export interface Rating {
  readonly value: number;
  readonly source: string;
}

/** A part's own rating by its magnitude; undefined when the sheet gives none. */
export function ratingOf(part: NetlistPart, key: FactKey, words: string): Rating | undefined {
  const value = magnitudeOf(part, key);
  return value === undefined || value === 0 ? undefined : { value, source: `${words} of ${part.ref}, ${originOf(part, key)}` };
}

/** A default that counts only where `package=` names it. */
export function packageRating(part: NetlistPart, table: Readonly<Record<string, number>>, words: string): Rating | undefined {
  const name = labelOf(part, 'package');
  const value = name === undefined ? undefined : table[name];
  return value === undefined ? undefined : { value, source: `${words} of package ${name}, common practice` };
}
