import type { NetlistPart, Wave } from '../netlist';
import { quantityOf } from './part-facts';

export interface Levels {
  readonly high: number;
  readonly low: number;
  /** Where they come from, for evidence. */
  readonly source: string;
}

function extremes(wave: Wave): readonly number[] {
  const [first = 0, second = 0] = wave.args;
  if (wave.shape === 'sin') return [first - Math.abs(second), first + Math.abs(second)];
  if (wave.shape === 'pwl') return wave.args.filter((_, index) => index % 2 === 1);
  return [first, second];
}

/** High and low of a control: its facts, else the extremes of its wave, else its DC value and 0. */
export function levelsOf(part: NetlistPart): Levels {
  const dc = quantityOf(part, 'value') ?? 0;
  const wave = part.wave ? extremes(part.wave) : [];
  const drawn = wave.length > 0 ? wave : [dc, 0];
  const high = quantityOf(part, 'high') ?? quantityOf(part, 'logic_level');
  const low = quantityOf(part, 'low');
  return {
    high: high ?? Math.max(...drawn),
    low: low ?? (high !== undefined && wave.length === 0 ? 0 : Math.min(...drawn)),
    source: high !== undefined || low !== undefined ? 'typed' : wave.length > 0 ? `wave of ${part.ref}` : `value of ${part.ref}`,
  };
}
