import { formatQuantity } from '@/lib/netlist/quantity/format-quantity';
import { monoWords } from '@/components/ui/mono-words';
import type { LadderPoint } from './ladder-point';

/** Volts as the ladder prints them: '325 V', '1.5 kV'. */
export function voltsWords(volts: number): string {
  return monoWords(formatQuantity(volts, 'V'));
}

/** Amps of a current limit: '0.5 A' from 0.1 A up, as power supplies show it, 'mA' below. */
export function ampsWords(amps: number): string {
  return amps >= 0.1 && amps < 1 ? `${Number(amps.toPrecision(4))} A` : monoWords(formatQuantity(amps, 'A'));
}

/** A hold point in a sentence: '325 V / 2 A'. */
export function pointWords(point: Pick<LadderPoint, 'volts' | 'amps'>): string {
  return `${voltsWords(point.volts)} / ${ampsWords(point.amps)}`;
}
