import type { Corner } from '../kinds/kind-engine';
import type { Facts } from '../netlist';
import { magnitude } from './fact-number';
import { thermalVoltage, type Assumption, type ModelResult } from './fitted-model';

/** What a data sheet says of a bipolar transistor; magnitudes, also of a PNP. */
export interface BipolarSheet {
  /** h_FE at `gainAmps` of collector current and `gainVolts` of V_CE. */
  readonly gain: number;
  readonly gainVolts: number;
  /** V_BE at `baseAmps` of collector current. */
  readonly vbe: number;
  readonly vbeAmps: number;
  /** V_CE(sat) at `satAmps` of collector and `satBaseAmps` of base current. */
  readonly vceSat: number;
  readonly satAmps: number;
  readonly satBaseAmps: number;
}

/** Gummel-Poon parameters; VAF and BR are taken, not fitted. */
export interface BipolarFit {
  readonly is: number;
  readonly bf: number;
  readonly br: number;
  readonly vaf: number;
  readonly rc: number;
  /** False when this gain cannot saturate the transistor at the sheet's own condition. */
  readonly saturates: boolean;
}

const earlyVolts = 100;
const reverseGain = 4;

/** Fits gain, V_BE and V_CE(sat) exactly at their conditions; no fall of h_FE at high current. Source: docs/engine.md 3.3. */
export function fitBipolar(sheet: BipolarSheet): BipolarFit {
  const is = sheet.vbeAmps / Math.expm1(sheet.vbe / thermalVoltage);
  const bf = sheet.gain / (1 + (sheet.gainVolts - sheet.vbe) / earlyVolts);
  const forced = sheet.satAmps / sheet.satBaseAmps;
  const saturates = forced < bf;
  const inner = saturates ? thermalVoltage * Math.log((1 + (forced + 1) / reverseGain) / (1 - forced / bf)) : sheet.vceSat;
  return {
    is, bf, br: reverseGain, vaf: earlyVolts, rc: Math.max(0, (sheet.vceSat - inner) / sheet.satAmps), saturates,
  };
}

/** Where the sheet is silent: conditions as parts of the rated current, values of a general-purpose transistor. */
const usual = { icMax: 0.1, gainShare: 0.1, satShare: 0.25, gainVolts: 5, forcedGain: 10, vbe: 0.7, vceSat: 0.2 };

/** A bipolar transistor from `hfe_min`, `hfe_typ`, `vbe`, `vce_sat`, `hfe_sat` and `ic_max` at one corner of its gain. */
export function bipolarModel(facts: Facts, type: 'npn' | 'pnp', corner: Corner): ModelResult {
  const assumed: Assumption[] = [];
  const gain = gainAt(facts, corner, assumed);
  if (gain === undefined) return { missing: 'hfe_min' };

  const take = (fact: 'ic_max' | 'vbe' | 'vce_sat' | 'hfe_sat', value: number, unit: string): number => {
    const stated = magnitude(facts, fact);
    if (stated === undefined) assumed.push({ fact, words: `not given: ${value}${unit}` });
    return stated ?? value;
  };
  const rated = take('ic_max', usual.icMax, ' A');
  const satAmps = usual.satShare * rated;
  const fit = fitBipolar({
    gain,
    gainVolts: usual.gainVolts,
    vbe: take('vbe', usual.vbe, ' V'),
    vbeAmps: usual.gainShare * rated,
    vceSat: take('vce_sat', usual.vceSat, ' V'),
    satAmps,
    satBaseAmps: satAmps / take('hfe_sat', usual.forcedGain, ''),
  });
  const { is, bf, br, vaf, rc } = fit;
  return { card: { type, flags: [], params: { is, bf, br, vaf, rc } }, assumed };
}

function gainAt(facts: Facts, corner: Corner, assumed: Assumption[]): number | undefined {
  const [min, typ] = [magnitude(facts, 'hfe_min'), magnitude(facts, 'hfe_typ')];
  if (corner === 'min') {
    if (min === undefined && typ !== undefined) assumed.push({ fact: 'hfe_min', words: `not given: ${typ}, the typical` });
    return min ?? typ;
  }
  if (typ === undefined && min !== undefined) assumed.push({ fact: 'hfe_typ', words: `not given: ${min}, the minimum` });
  else if (corner === 'max') assumed.push({ fact: 'hfe_typ', words: 'a maximum is not given: the typical' });
  return typ ?? min;
}
