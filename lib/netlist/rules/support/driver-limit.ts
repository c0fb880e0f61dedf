import { magnitudeOf, originOf, quantityOf } from '../../circuit/part-facts';
import type { Control } from '../../circuit/sources';
import type { Rating } from './rating';

/** Amps that a microcontroller pin may give where its sheet is silent (`docs/rules.md` 31). */
const assumedPinAmps = 20e-3;

/** Most amps a control can give; undefined where nothing limits it that is known. */
export function driverLimit({ part, nature }: Control): Rating | undefined {
  const own = magnitudeOf(part, 'io_max') ?? magnitudeOf(part, 'ilim');
  if (own !== undefined) return { value: own, source: `current limit of ${part.ref}, ${originOf(part, magnitudeOf(part, 'io_max') === undefined ? 'ilim' : 'io_max')}` };
  return nature === 'pin' ? { value: assumedPinAmps, source: `current limit of ${part.ref}, assumed` } : undefined;
}

/** Ohms inside a control. */
export const driverOhms = ({ part }: Control): number => Math.max(0, quantityOf(part, 'rs') ?? 0);
