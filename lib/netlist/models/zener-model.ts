import type { Facts } from '../netlist';
import { magnitude } from './fact-number';
import { thermalVoltage, type Assumption, type FittedModel, type ModelResult } from './fitted-model';

/** What a zener's sheet states, SI units. */
export interface ZenerSheet {
  readonly vz: number;
  readonly izt: number;
  /** Dynamic resistance at `izt`. */
  readonly zzt: number;
  /** Dynamic resistance near the knee. */
  readonly knee?: { readonly zzk: number; readonly izk: number };
  readonly forward: { readonly volts: number; readonly amps: number };
}

const forwardN = 1.2;
const siliconGap = 1.11;

/**
 * Breakdown law V = BV + NBV·V_T·ln(I/IBV) + I·RS through V_Z at I_ZT with slope Z_ZT. When knee and slope contradict
 * each other, Z_ZT is kept and the knee dropped. Source: docs/engine.md 3.2.
 */
export function fitZener(sheet: ZenerSheet): FittedModel['card'] {
  const { vz, izt, zzt, knee, forward } = sheet;
  const slope = (zzt * izt) / thermalVoltage;
  let nbv = Math.min(1, slope);
  let rs = slope > 1 ? zzt - thermalVoltage / izt : 0;
  if (knee !== undefined) {
    nbv = (knee.zzk - zzt) / (thermalVoltage * (1 / knee.izk - 1 / izt));
    rs = zzt - (nbv * thermalVoltage) / izt;
    if (rs < 0) {
      rs = 0;
      nbv = slope;
    }
  }
  // A high-resistance zener would leave the forward point nothing but its series resistance.
  const amps = rs > 0 ? Math.min(forward.amps, (0.3 * forward.volts) / rs) : forward.amps;
  const is = amps / Math.expm1((forward.volts - amps * rs) / (forwardN * thermalVoltage));
  return { type: 'd', flags: [], params: { is, n: forwardN, rs, bv: vz - izt * rs, ibv: izt, nbv, eg: siliconGap } };
}

/** Of its rated power a zener takes this much at I_ZT: 1N4728–1N4751 (sources.md 12.2). */
const testPowerShare = 0.25;
/** Z_ZT·I_ZT as a part of V_Z: 1N4742, 12 V, 9 Ω, 21 mA (sources.md 12.2). */
const slopeShare = 0.016;
const usualTestCurrent = 5e-3;
const usualForward = { volts: 0.75, amps: 10e-3 };

/** A zener from `vz`, `i_test`, `zz`, `pmax` and `vf`. Without `vz` there is no model. */
export function zenerModel(facts: Facts): ModelResult {
  const vz = magnitude(facts, 'vz');
  if (vz === undefined) return { missing: 'vz' };
  const assumed: Assumption[] = [];

  let izt = magnitude(facts, 'i_test');
  if (izt === undefined) {
    const power = magnitude(facts, 'pmax');
    izt = power === undefined ? usualTestCurrent : (testPowerShare * power) / vz;
    assumed.push({ fact: 'i_test', words: `not given: ${izt.toPrecision(2)} A` });
  }
  let zzt = magnitude(facts, 'zz');
  if (zzt === undefined) {
    zzt = (slopeShare * vz) / izt;
    assumed.push({ fact: 'zz', words: `not given: ${zzt.toPrecision(2)} Ω` });
  }
  const vf = magnitude(facts, 'vf');
  return { card: fitZener({ vz, izt, zzt, forward: { ...usualForward, volts: vf ?? usualForward.volts } }), assumed };
}
