import { describe, expect, it } from 'vitest';
import type { Facts, ModelCard } from '../netlist';
import { bipolarModel, fitBipolar } from './bipolar-model';
import { diodeModel } from './diode-model';
import { thermalVoltage, type ModelResult } from './fitted-model';
import { junctionVolts } from './junction-fit';
import { ledModel } from './led-model';
import { engineNumber, modelLine } from './model-line';
import { fitZener, zenerModel } from './zener-model';

const volts = (card: Omit<ModelCard, 'name'>, amps: number): number =>
  junctionVolts({ is: card.params.is ?? 0, n: card.params.n ?? 0, rs: card.params.rs ?? 0 }, amps);

const assumedFacts = (result: ModelResult): string[] =>
  'missing' in result ? [result.missing] : result.assumed.map(({ fact }) => fact);

describe('an LED', () => {
  it.each([
    ['infrared', 1.3], ['red', 1.9], ['amber', 2.05], ['yellow', 2.05], ['green', 2.2], ['blue', 3.2], ['white', 3.2],
    ['ultraviolet', 3.5],
  ])('has the default of its colour: %s %f V at 20 mA, said as assumed', (colour, vf) => {
    const model = ledModel({ colour });
    expect(volts(model.card, 20e-3)).toBeCloseTo(vf, 6);
    expect(assumedFacts(model)).toEqual(['vf', 'i_test']);
  });

  it('meets its sheet', () => {
    const model = ledModel({ colour: 'red', vf: 2, i_test: 10e-3 });
    expect(volts(model.card, 10e-3)).toBeCloseTo(2, 9);
    expect(model.assumed).toEqual([]);
  });

  it('is taken for red when nothing is known, and by its volts when they are', () => {
    expect(volts(ledModel({}).card, 20e-3)).toBeCloseTo(1.9, 6);
    expect(ledModel({ vf: 3.3 }).card.params.n).toBe(3);
    expect(ledModel({ vf: 3, colour: 'green' }).card.params.n).toBe(3);
  });
});

describe('a diode', () => {
  it.each<[string, Facts, 'diode' | 'schottky', number, number]>([
    ['a 1 A rectifier', { if_max: 1 }, 'diode', 1, 1],
    ['a 3 A rectifier', { if_max: 3 }, 'diode', 3, 1],
    ['a signal diode', { if_max: 0.15 }, 'diode', 10e-3, 0.72],
    ['a 1 A Schottky', { if_max: 1 }, 'schottky', 1, 0.6],
    ['a stated point', { vf: 0.85, i_test: 0.2 }, 'diode', 0.2, 0.85],
  ])('passes through the point of %s', (_, facts, kind, amps, expected) => {
    expect(volts(diodeModel(facts, kind).card, amps)).toBeCloseTo(expected, 6);
  });

  it('does not clamp above its rating', () => {
    expect(diodeModel({ vr_max: 40 }, 'schottky').card.params.bv).toBeUndefined();
  });
});

describe('a zener', () => {
  /** docs/engine.md 3.2: the breakdown law at I_ZT, its slope there and near the knee. */
  const slope = (card: Omit<ModelCard, 'name'>, amps: number): number =>
    (card.params.nbv ?? 0) * thermalVoltage / amps + (card.params.rs ?? 0);

  it.each([
    ['12 V 5 mA', { vz: 12, izt: 5e-3, zzt: 20, knee: { zzk: 90, izk: 1e-3 } }, 90],
    ['1N4742', { vz: 12, izt: 21e-3, zzt: 9, knee: { zzk: 700, izk: 0.25e-3 } }, 700],
  ])('%s has its voltage, its slope and its knee', (_, sheet, zzk) => {
    const card = fitZener({ ...sheet, forward: { volts: 0.75, amps: 10e-3 } });
    expect((card.params.bv ?? 0) + sheet.izt * (card.params.rs ?? 0)).toBeCloseTo(sheet.vz, 9);
    expect(slope(card, sheet.izt)).toBeCloseTo(sheet.zzt, 9);
    expect(slope(card, sheet.knee.izk)).toBeCloseTo(zzk, 6);
  });

  it('keeps the slope and drops the knee where they contradict each other', () => {
    const sheet = { vz: 5.1, izt: 5e-3, zzt: 35, knee: { zzk: 550, izk: 1e-3 }, forward: { volts: 0.75, amps: 10e-3 } };
    const card = fitZener(sheet);
    expect(card.params.rs).toBe(0);
    expect(slope(card, 5e-3)).toBeCloseTo(35, 9);
  });

  it('needs its voltage and says what else it assumed', () => {
    expect(zenerModel({})).toEqual({ missing: 'vz' });
    expect(assumedFacts(zenerModel({ vz: 15, pmax: 1 }))).toEqual(['i_test', 'zz']);
  });
});

describe('a bipolar transistor', () => {
  it('has its gain, V_BE and V_CE(sat) by the equations of the model (2N3904-like)', () => {
    const fit = fitBipolar({
      gain: 100, gainVolts: 1, vbe: 0.69, vbeAmps: 10e-3, vceSat: 0.2, satAmps: 10e-3, satBaseAmps: 1e-3,
    });
    expect(thermalVoltage * Math.log1p(10e-3 / fit.is)).toBeCloseTo(0.69, 9);
    expect(fit.bf * (1 + (1 - 0.69) / fit.vaf)).toBeCloseTo(100, 9);
    const inner = thermalVoltage * Math.log((1 + 11 / fit.br) / (1 - 10 / fit.bf));
    expect(inner + 10e-3 * fit.rc).toBeCloseTo(0.2, 9);
    expect(fit.saturates).toBe(true);
  });

  it('says when its gain cannot saturate it', () => {
    const fit = fitBipolar({
      gain: 8, gainVolts: 5, vbe: 0.7, vbeAmps: 10e-3, vceSat: 0.2, satAmps: 10e-3, satBaseAmps: 1e-3,
    });
    expect(fit).toMatchObject({ saturates: false, rc: 0 });
  });

  it('takes the gain of the corner and needs one', () => {
    const gain = (corner: 'min' | 'typ' | 'max'): number => {
      const model = bipolarModel({ hfe_min: 100, hfe_typ: 300 }, 'npn', corner);
      return 'missing' in model ? 0 : model.card.params.bf ?? 0;
    };
    expect(gain('typ') / gain('min')).toBeCloseTo(3, 9);
    expect(gain('max')).toBe(gain('typ'));
    expect(bipolarModel({}, 'npn', 'typ')).toEqual({ missing: 'hfe_min' });
  });
});

describe('a model line', () => {
  it('holds generated words and exponents only', () => {
    expect(modelLine('mp1', { type: 'vdmos', flags: ['pchan'], params: { vto: -3, kp: 16.5 } }))
      .toBe('.model mp1 vdmos(pchan vto=-3.000000000e+0 kp=1.650000000e+1)');
  });

  it('refuses what is no number', () => {
    expect(() => engineNumber(Number.NaN)).toThrow(RangeError);
  });
});
