import type { Facts } from '../netlist';
import { diodeCard } from './diode-model';
import { magnitude } from './fact-number';
import type { Assumption, FittedModel } from './fitted-model';
import { fitOnePoint } from './junction-fit';

interface LedType {
  readonly words: string;
  /** Forward volts when the sheet is silent. */
  readonly vf: number;
  readonly n: number;
  readonly rs: number;
}

/** Type defaults of docs/engine.md 3.2; the volts lie in the ranges of sources.md 7 ("Vf by colour at 20 mA", seen). */
const types = {
  infrared: { words: 'infrared', vf: 1.3, n: 1.6, rs: 3 },
  red: { words: 'red', vf: 1.9, n: 2, rs: 5 },
  amber: { words: 'amber', vf: 2.05, n: 2, rs: 6 },
  yellow: { words: 'yellow', vf: 2.05, n: 2, rs: 6 },
  green: { words: 'green (GaP)', vf: 2.2, n: 2, rs: 10 },
  'InGaN green': { words: 'green (InGaN)', vf: 3, n: 3, rs: 10 },
  blue: { words: 'blue', vf: 3.2, n: 3, rs: 10 },
  white: { words: 'white', vf: 3.2, n: 3, rs: 10 },
  ultraviolet: { words: 'ultraviolet', vf: 3.5, n: 3, rs: 10 },
} as const satisfies Record<string, LedType>;

/** Current at which an indicator's forward voltage is stated, amps (sources.md 7). */
const usualTestCurrent = 20e-3;
/** A green LED above this is InGaN, volts: GaP ends below, InGaN starts above (sources.md 7). */
const greenDivide = 2.6;
/**
 * Band gap above the junction's volts, eV, which makes an LED lose 2 mV/K: dV/dT = (V − EG)/T − 3·k/q of the diode law
 * with XTI 3. Common practice, no source.
 */
const gapAboveVolts = 0.52;

/** An LED from its colour, and from `vf` at `i_test` where the sheet gives them. */
export function ledModel(facts: Facts): FittedModel {
  const assumed: Assumption[] = [];
  const stated = magnitude(facts, 'vf');
  const type = ledType(facts, stated, assumed);

  if (stated === undefined) assumed.push({ fact: 'vf', words: `not given: ${type.vf} V, typical of ${type.words}` });
  const test = magnitude(facts, 'i_test');
  const amps = test ?? Math.min(usualTestCurrent, magnitude(facts, 'if_max') ?? usualTestCurrent);
  if (test === undefined) assumed.push({ fact: 'i_test', words: `not given: ${amps * 1e3} mA` });

  const volts = stated ?? type.vf;
  const fit = fitOnePoint({ volts, amps }, type.n, type.rs);
  return { card: diodeCard(fit, volts - amps * fit.rs + gapAboveVolts), assumed };
}

function ledType(facts: Facts, stated: number | undefined, assumed: Assumption[]): LedType {
  const colour = typeof facts.colour === 'string' ? facts.colour.trim().toLowerCase() : '';
  if (colour === 'green' && stated !== undefined && stated > greenDivide) return types['InGaN green'];
  if (Object.hasOwn(types, colour)) return types[colour as keyof typeof types];
  const nearest = stated === undefined ? types.red : nearestType(stated);
  assumed.push({
    fact: 'colour',
    words: stated === undefined ? 'not given: red, whose low voltage lets the most current pass' : `not given: ${nearest.words}, by V_F`,
  });
  return nearest;
}

function nearestType(vf: number): LedType {
  return Object.values<LedType>(types).reduce((best, type) => (Math.abs(type.vf - vf) < Math.abs(best.vf - vf) ? type : best));
}
