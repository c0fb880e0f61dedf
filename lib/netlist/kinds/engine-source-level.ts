import { waveStart } from '../models/wave-start';
import type { NetlistPart } from '../netlist';

/** Volts or amps of a source as drawn: its DC value, else where its wave begins. */
export function drawnLevel(part: NetlistPart): number | undefined {
  const value = part.facts.value;
  if (typeof value === 'number') return value;
  return part.wave === undefined ? undefined : waveStart(part.wave);
}
