import type { LadderPoint } from './ladder-point';

const thin = ' ';

function engineering(value: number, unit: string): string {
  if (value >= 1_000) return `${Number((value / 1_000).toPrecision(4))}${thin}k${unit}`;
  if (value < 0.1) return `${Number((value * 1_000).toPrecision(3))}${thin}m${unit}`;
  return `${Number(value.toPrecision(4))}${thin}${unit}`;
}

/** Volts as the ladder prints them: '325 V', '1.5 kV'. */
export function voltsWords(volts: number): string {
  return engineering(volts, 'V');
}

/** Amps as the ladder prints them: '0.5 A', '20 mA'. */
export function ampsWords(amps: number): string {
  return engineering(amps, 'A');
}

/** A hold point in a sentence: '325 V / 2 A'. */
export function pointWords(point: Pick<LadderPoint, 'volts' | 'amps'>): string {
  return `${voltsWords(point.volts)} / ${ampsWords(point.amps)}`;
}
