import type { Facts } from '../netlist';
import { magnitude } from './fact-number';
import type { Assumption, FittedModel } from './fitted-model';
import { fitOnePoint, fitTwoPoints, type ForwardPoint, type JunctionFit } from './junction-fit';

/**
 * What stands in for a silent data sheet: typical points of a general-purpose part. Sources: 1N4148, 1N4007 and 1N5819
 * in docs/engine.md 3.2; limits in sources.md 12.1.
 */
interface DiodeFamily {
  readonly words: string;
  readonly low: ForwardPoint;
  readonly high: ForwardPoint;
  readonly nMax: number;
  /** Emission coefficient when one point is known. */
  readonly n: number;
  /** Band gap for the temperature law, eV. */
  readonly gap: number;
}

const signal: DiodeFamily = {
  words: 'a silicon signal diode', nMax: 2, n: 1.8, gap: 1.11,
  low: { volts: 0.62, amps: 1e-3 }, high: { volts: 0.72, amps: 10e-3 },
};
const rectifier: DiodeFamily = {
  words: 'a silicon rectifier', nMax: 2, n: 1.8, gap: 1.11,
  low: { volts: 0.75, amps: 0.1 }, high: { volts: 1, amps: 1 },
};
const schottky: DiodeFamily = {
  words: 'a Schottky rectifier', nMax: 1.2, n: 1.1, gap: 0.69,
  low: { volts: 0.45, amps: 0.1 }, high: { volts: 0.6, amps: 1 },
};

/** Up to this rated current a silicon diode counts as a signal diode, amps. */
const signalLimit = 0.5;
/** Of a single point's volts this much is laid on the series resistance. */
const seriesShare = 0.05;

/**
 * A diode from `vf` at `i_test`, else from typical points of its family, scaled to its rated current.
 * Breakdown is left out: a reverse voltage above the rating must be seen by the rules, not clamped by the model.
 */
export function diodeModel(facts: Facts, kind: 'diode' | 'schottky'): FittedModel {
  const rated = magnitude(facts, 'if_max');
  const family = kind === 'schottky' ? schottky : rated !== undefined && rated < signalLimit ? signal : rectifier;
  const vf = magnitude(facts, 'vf');
  if (vf === undefined) {
    const scale = family !== signal && rated !== undefined ? rated / family.high.amps : 1;
    const fit = fitTwoPoints(
      { volts: family.low.volts, amps: family.low.amps * scale },
      { volts: family.high.volts, amps: family.high.amps * scale },
      family.nMax,
    );
    const words = `not given: ${family.high.volts} V at ${family.high.amps * scale} A, typical of ${family.words}`;
    return { card: diodeCard(fit, family.gap), assumed: [{ fact: 'vf', words }] };
  }

  const test = magnitude(facts, 'i_test');
  const amps = test ?? rated ?? family.high.amps;
  const assumed: Assumption[] = test === undefined
    ? [{ fact: 'i_test', words: rated === undefined ? `not given: ${amps} A` : 'not given: the rated current' }]
    : [];
  return { card: diodeCard(fitOnePoint({ volts: vf, amps }, family.n, (seriesShare * vf) / amps), family.gap), assumed };
}

/** The SPICE card of a fitted junction. `gap` in eV sets how it moves with temperature. */
export function diodeCard(fit: JunctionFit, gap: number): FittedModel['card'] {
  return { type: 'd', flags: [], params: { is: fit.is, n: fit.n, rs: fit.rs, eg: gap } };
}
