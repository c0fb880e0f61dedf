import { describe, expect, it } from 'vitest';
import { fitCharge, type CapacitanceSheet, type ChargeFit, type GateChargeSheet } from './mosfet-charge';

const sheet: CapacitanceSheet = { ciss: 1960e-12, coss: 250e-12, crss: 40e-12, volts: 25 };
const charge: GateChargeSheet = {
  qg: 71e-9, qgd: 21e-9, gateVolts: 10, busVolts: 80, sourceVolts: 0.06, channelVolts: 0.14, plateau: 4.3,
};

/** Gate-drain capacitance at V_GD, farads (sources.md 13, confirmed there by a run). */
function gateDrain(fit: ChargeFit, volts: number): number {
  const s = (fit.cgdmax - fit.cgdmin) / (1 + Math.PI / 2);
  return (volts < 0 ? s * Math.atan(fit.a * volts) : s * Math.tanh(fit.a * volts)) + fit.cgdmax - s;
}

it('repeats the worked values of sources.md 13 [run]', () => {
  const fit = { cgdmax: 2.45e-9, cgdmin: 10e-12, a: 0.3, cgs: 0, cjo: 0, from: 'gate charge' } as const;
  for (const [volts, farads] of [[0, 1500.88], [1, 1224.25], [5, 568.09], [10, 315.38], [25, 135.81], [100, 41.63]] as const) {
    expect(gateDrain(fit, -volts) * 1e12).toBeCloseTo(farads, 2);
  }
});

describe('with a gate charge', () => {
  const fit = fitCharge(sheet, charge);

  it('gives C_iss, C_rss and C_oss at 25 V', () => {
    expect(fit.from).toBe('gate charge');
    expect(gateDrain(fit, -25) * 1e12).toBeCloseTo(40, 6);
    expect((fit.cgs + gateDrain(fit, -25)) * 1e12).toBeCloseTo(1960, 6);
    expect((fit.cjo / Math.sqrt(1 + 25 / 0.8) + gateDrain(fit, -25)) * 1e12).toBeCloseTo(250, 6);
  });

  it('gives the stated total charge by integration', () => {
    const [from, to] = [-80, 10 - 0.06 - 0.14];
    const steps = 200_000;
    let total = fit.cgs * (10 - 0.06);
    for (let step = 0; step < steps; step += 1) {
      total += gateDrain(fit, from + ((to - from) * (step + 0.5)) / steps) * ((to - from) / steps);
    }
    expect(total * 1e9).toBeCloseTo(71, 3);
  });
});

it('says when the gate charge contradicts the capacitances, and when there is none', () => {
  expect(fitCharge(sheet, { ...charge, qg: 5e-9 })).toMatchObject({ cgdmax: 40e-12, cgdmin: 40e-12 });
  const silent = fitCharge(sheet);
  expect(silent.cgdmax).toBeCloseTo(200e-12, 18);
  expect(gateDrain(silent, -25) * 1e12).toBeCloseTo(40, 6);
});

it('has the body capacitance of sources.md 13: 2N7000, 20 pF at 25 V', () => {
  expect(fitCharge({ ciss: 60e-12, coss: 25e-12, crss: 5e-12, volts: 25 }).cjo * 1e12).toBeCloseTo(113.6, 1);
});
