import type { Wave } from '../../netlist';
import { numberOf } from '../element-line';
import { voltageSourceDeck } from '../source-line';

/** Sine of the stated rms volts and frequency, without the band of the mains. */
function sineOf(rms: number | undefined, hertz: number | undefined): Wave | undefined {
  return rms === undefined || hertz === undefined ? undefined : { shape: 'sin', args: [0, Math.SQRT2 * rms, hertz] };
}

export const acMainsDeck = voltageSourceDeck(['L', 'N'], (part) => sineOf(numberOf(part, 'rms'), numberOf(part, 'f')));
