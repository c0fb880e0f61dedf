import type { Corner } from '../kinds/kind-engine';
import type { Facts } from '../netlist';
import { magnitude } from './fact-number';
import { thermalVoltage, type Assumption, type ModelResult } from './fitted-model';
import { channelVolts, fitChannel, subthreshold, type ChannelFit } from './mosfet-channel';
import { fitCharge, type ChargeFit } from './mosfet-charge';
import { thresholdAt } from './mosfet-threshold';

/** V_GS at which R_DS(on) is stated when the sheet does not say: ten volts, or the level of a logic-level part. */
const usualOnVolts = 10;
const logicOnVolts = 4.5;
/** R_DS(on) and g_fs are usually stated at half of the rated current. */
const onShare = 0.5;
const bodyDiode = { volts: 1, n: 1.1, seriesShare: 0.15 };
/** V_DS at which capacitances, and part of V_DS(max) at which Q_g, are usually stated. */
const capacitanceVolts = 25;
const chargeShare = 0.8;
const gateResistance = 1;

/**
 * A power or small-signal MOSFET as ngspice's VDMOS, from data-sheet facts at one threshold corner (docs/engine.md 3.1).
 * Needs a threshold and `rds_on`; what else the sheet leaves out is assumed and said.
 * Avalanche is left out: a drain voltage above the rating must be seen by the rules, not clamped by the model.
 */
export function mosfetModel(facts: Facts, channel: 'n' | 'p', corner: Corner): ModelResult {
  const threshold = thresholdAt(facts, corner);
  if ('missing' in threshold) return threshold;
  const onResistance = magnitude(facts, 'rds_on');
  if (onResistance === undefined) return { missing: 'rds_on' };

  const assumed: Assumption[] = [...threshold.assumed];
  const onVolts = onVoltsOf(facts, assumed);
  const onAmps = onAmpsOf(facts, onResistance, onVolts - threshold.volts, assumed);
  const fit = fitChannel({
    threshold: threshold.volts,
    thresholdCurrent: threshold.amps,
    onResistance,
    onVolts,
    onAmps,
    transconductance: magnitude(facts, 'gfs'),
    plateau: magnitude(facts, 'v_plateau'),
  });
  if (fit === null) return { missing: 'rds_on_spec_vgs' };

  const charge = chargeOf(facts, fit, onVolts, onAmps);
  return {
    assumed,
    card: {
      type: 'vdmos',
      flags: channel === 'p' ? ['pchan'] : [],
      params: {
        vto: channel === 'p' ? -fit.vto : fit.vto,
        kp: fit.kp, ksubthres: subthreshold, rs: fit.rs, rd: fit.rd, rg: gateResistance,
        ...(charge === null ? {} : {
          cgs: charge.cgs, cgdmax: charge.cgdmax, cgdmin: charge.cgdmin, a: charge.a, cjo: charge.cjo, vj: 0.8, m: 0.5,
        }),
        ...bodyDiodeOf(facts, onAmps, assumed),
      },
    },
  };
}

function onVoltsOf(facts: Facts, assumed: Assumption[]): number {
  const stated = magnitude(facts, 'rds_on_spec_vgs');
  if (stated !== undefined) return stated;
  const volts = magnitude(facts, 'logic_level') !== undefined ? logicOnVolts : usualOnVolts;
  assumed.push({ fact: 'rds_on_spec_vgs', words: `not given: ${volts} V` });
  return volts;
}

/** Without a rated current the point is set where the channel is surely in its ohmic region. */
function onAmpsOf(facts: Facts, onResistance: number, overdrive: number, assumed: Assumption[]): number {
  const rated = magnitude(facts, 'id_max');
  if (rated !== undefined) return onShare * rated;
  assumed.push({ fact: 'id_max', words: 'not given: R_DS(on) taken as stated for a small current' });
  return (0.05 * Math.max(overdrive, subthreshold)) / onResistance;
}

function bodyDiodeOf(facts: Facts, amps: number, assumed: Assumption[]): Record<string, number> {
  const stated = magnitude(facts, 'vsd');
  if (stated === undefined) assumed.push({ fact: 'vsd', words: `not given: ${bodyDiode.volts} V` });
  const volts = stated ?? bodyDiode.volts;
  const rb = (bodyDiode.seriesShare * volts) / amps;
  const is = amps / Math.exp((volts - amps * rb) / (bodyDiode.n * thermalVoltage));
  return { is, n: bodyDiode.n, rb };
}

/** Null when the sheet gives no capacitances: they do not matter at DC. */
function chargeOf(facts: Facts, fit: ChannelFit, onVolts: number, onAmps: number): ChargeFit | null {
  const [ciss, coss, crss] = [magnitude(facts, 'ciss'), magnitude(facts, 'coss'), magnitude(facts, 'crss')];
  if (ciss === undefined || crss === undefined) return null;
  const sheet = { ciss, coss: coss ?? crss, crss, volts: capacitanceVolts };
  const [qg, rating] = [magnitude(facts, 'qg'), magnitude(facts, 'vds_max')];
  if (qg === undefined || rating === undefined) return fitCharge(sheet);
  return fitCharge(sheet, {
    qg,
    qgd: magnitude(facts, 'qgd'),
    gateVolts: onVolts,
    busVolts: chargeShare * rating,
    sourceVolts: onAmps * fit.rs,
    channelVolts: channelVolts(fit, onVolts, onAmps),
    plateau: fit.vto + Math.sqrt((2 * onAmps) / fit.kp) + onAmps * fit.rs,
  });
}
