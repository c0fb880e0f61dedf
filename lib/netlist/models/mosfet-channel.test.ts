import { describe, expect, it } from 'vitest';
import { channelVolts, fitChannel, subthreshold, type ChannelFit, type ChannelSheet } from './mosfet-channel';

const sheet: ChannelSheet = {
  threshold: 3, thresholdCurrent: 250e-6, onResistance: 0.0374, onVolts: 10, onAmps: 16, transconductance: 21,
};

/** Saturated drain current of the law, solved for the drop across the source resistance. */
function saturatedAmps(fit: ChannelFit, gateVolts: number): number {
  let amps = 0;
  for (let step = 0; step < 500; step += 1) {
    const gate = subthreshold * Math.log1p(Math.exp((gateVolts - amps * fit.rs - fit.vto) / subthreshold));
    amps += 0.2 * ((fit.kp / 2) * gate * gate - amps);
  }
  return amps;
}

describe('a 100 V, 37 mΩ part', () => {
  const fit = fitChannel(sheet) as ChannelFit;

  it('carries the stated current at its threshold', () => {
    expect(saturatedAmps(fit, 3) / 250e-6).toBeCloseTo(1, 3);
  });

  it('has the stated on-resistance', () => {
    const volts = channelVolts(fit, 10, 16) + 16 * (fit.rs + fit.rd);
    expect(volts / 16).toBeCloseTo(0.0374, 9);
  });

  it('has the stated transconductance at 16 A', () => {
    const gate = fit.vto + Math.sqrt(32 / fit.kp) + 16 * fit.rs;
    const slope = (saturatedAmps(fit, gate + 0.01) - saturatedAmps(fit, gate - 0.01)) / 0.02;
    expect(slope / 21).toBeCloseTo(1, 3);
    expect(fit.kpFrom).toBe('transconductance');
    expect(fit.kpRaised).toBe(false);
  });
});

it('keeps the on-resistance and lets the transconductance give way', () => {
  const fit = fitChannel({ ...sheet, onResistance: 0.117, onAmps: 11, transconductance: 5.3 }) as ChannelFit;
  expect(fit.kpRaised).toBe(true);
  expect((channelVolts(fit, 10, 11) + 11 * (fit.rs + fit.rd)) / 11).toBeCloseTo(0.117, 9);
});

it('takes the plateau, then the on-resistance, where no transconductance is given', () => {
  const { transconductance: _, ...bare } = sheet;
  expect(fitChannel({ ...bare, plateau: 5 })?.kpFrom).toBe('plateau');
  expect(fitChannel(bare)?.kpFrom).toBe('on-resistance');
});

it('has no answer for an on-resistance below the threshold', () => {
  expect(fitChannel({ ...sheet, threshold: 4, onVolts: 2 })).toBeNull();
});
