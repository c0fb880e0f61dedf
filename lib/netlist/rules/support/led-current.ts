import type { LedBranch } from '../../circuit/led-branches';
import { originOf, magnitudeOf } from '../../circuit/part-facts';
import type { NetlistPart } from '../../netlist';
import type { RunPoint } from '../../points/point-set';
import type { StressLimit } from './stress';

/** Amps into a pin at a point; undefined where the run has none. */
export const ampsInto = (point: RunPoint, part: NetlistPart, pin: string): number | undefined => point.op.amps[`${part.ref}:${pin}`];

/** Forward amps of an LED at a point. */
export const ledAmps = (led: NetlistPart) => (point: RunPoint): number | undefined => ampsInto(point, led, 'A');

/** LED of a branch with the least current rating, which decides for all of it; null while one has none. */
export function weakestLed(branch: LedBranch): { readonly led: NetlistPart; readonly amps: number } | { readonly missing: NetlistPart } {
  let weakest: { led: NetlistPart; amps: number } | null = null;
  for (const led of branch.leds) {
    const amps = magnitudeOf(led, 'if_max');
    if (amps === undefined || amps === 0) return { missing: led };
    if (!weakest || amps < weakest.amps) weakest = { led, amps };
  }
  return weakest ?? { missing: branch.leds[0]! };
}

export const ledLimitSource = (led: NetlistPart, factor: number): string =>
  `${factor === 1 ? '' : `${factor} × `}I_F maximum of ${led.ref}, ${originOf(led, 'if_max')}`;

/** Limit at which an LED's resistor is far too small. */
export const undersizedLimit = (led: NetlistPart, amps: number, factor: number): StressLimit =>
  ({ severity: 'stop', limit: amps * factor, at: 'stated', source: ledLimitSource(led, factor) });

/** `R1 and D1` first parts of a branch: what to change, then the LEDs, then the transistor that carries it. */
export const branchRefs = (branch: LedBranch): readonly string[] =>
  [...branch.resistors, ...branch.leds, ...branch.transistors].map((part) => part.ref);

export const branchTarget = (branch: LedBranch): Readonly<Record<string, readonly string[]>> =>
  ({ led: branch.leds.map((led) => led.id), resistor: branch.resistors.map((part) => part.id) });
