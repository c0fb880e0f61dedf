import { describe, expect, it } from 'vitest';
import { percentOff, referenceEngine } from './support/reference-engine';
import { crossing, rangeFrom } from './support/waveform';

/** Values of docs/sources.md over time and frequency. Section, source and mark stand in each title. */
const engine = referenceEngine();
/** Near enough to an ideal diode: 1 mV at an ampere. */
const idealDiode = '.model DI D(IS=1e-12 N=0.001)';

describe('sources.md 6.2, F5: induced V_GS = R·C_gd·dv/dt·(1 − e^(−V_DS/(dv/dt·R·C_iss))), C_gd 5 pF, C_iss 60 pF, 48 V', () => {
  it.each([
    ['1 kΩ, 0.1 V/ns: 0.499832 V [run]', 1e3, 0.1e9, 0.499832],
    ['1 kΩ, 1 V/ns: 2.7534 V [calc]', 1e3, 1e9, 2.7534],
    ['10 kΩ, 1 V/ns: 3.8442 V [calc]', 1e4, 1e9, 3.8442],
    ['10 Ω, 1 V/ns: 0.0500 V [calc]', 10, 1e9, 0.05],
  ])('%s', async (_, ohms, slope, expected) => {
    const rise = 48 / slope;
    const gate = await engine.waveform('tran', [
      `Vd d 0 PULSE(0 48 1n ${rise} ${rise} 1 2)`, 'Cgd d g 5p', 'Cgs g 0 55p', `Rg g 0 ${ohms}`,
      `.tran ${rise / 500} ${1e-9 + 1.2 * rise} 0 ${rise / 2000}`, '.save v(g)',
    ], 'v(g)');
    expect(percentOff(rangeFrom(gate, 0).max, expected)).toBeLessThan(0.05);
  });
});

it('sources.md 6.1, G12, IEEE Region 3 brain teaser [calc, question seen]: 200 Ω, 15 pF, 5 V drive reaches 4 V in 4.83 ns', async () => {
  const gate = await engine.waveform('tran', ['V1 a 0 PULSE(0 5 0 1f 1f 1 2)', 'R1 a g 200', 'C1 g 0 15p', '.tran 5p 10n 0 5p'], 'v(g)');
  expect(percentOff(crossing(gate, 4, 'up'), 4.83e-9)).toBeLessThan(0.1);
});

describe('sources.md 11, discharge t = R·C·ln(V0/V)', () => {
  it.each([
    ['195 µF, 1500 V to 320 V, 50 Ω: 0.015062769 s [seen, scribd.com/document/347454186]', 195e-6, 50, 1500, 320, 0.015062769],
    ['470 µF, 400 V to 50 V, 10 kΩ: 9.773 s [seen, resicalc.com]', 470e-6, 1e4, 400, 50, 9.773],
    ['470 µF, 325.27 V to 60 V, 100 kΩ: 79.4446 s [run]', 470e-6, 1e5, 325.27, 60, 79.4446],
    ['470 µF, 325.27 V to 50 V, 100 kΩ: 88.01 s [calc]', 470e-6, 1e5, 325.27, 50, 88.01],
    ['470 nF, 357.8 V to 60 V, 1 MΩ: 0.839 s [calc]', 470e-9, 1e6, 357.8, 60, 0.839],
    ['220 nF, 325.27 V to 34 V, 1 MΩ: 0.497 s [calc]', 220e-9, 1e6, 325.27, 34, 0.497],
  ])('%s', async (_, farads, ohms, from, to, seconds) => {
    const volts = await engine.waveform('tran', [
      `C1 p 0 ${farads} IC=${from}`, `R1 p 0 ${ohms}`, `.tran ${seconds / 500} ${1.2 * seconds} 0 ${seconds / 1000} uic`,
    ], 'v(p)');
    expect(percentOff(crossing(volts, to, 'down'), seconds)).toBeLessThan(0.05);
  });
});

it('sources.md 8, relay of 12 V, 100 Ω, 0.5 H [calc]: 0.7 V clamp, current gone after 14.49 ms', async () => {
  const amps = await engine.waveform('tran', [
    'L1 x y 0.5 IC=0.12', 'R1 y z 100', 'V1 z w 0.699', 'D1 w x DI', idealDiode, 'Rg x 0 1', '.tran 10u 20m 0 10u uic', '.save i(l1)',
  ], 'i(l1)');
  expect(percentOff(crossing(amps, 1e-6, 'down'), 14.49e-3)).toBeLessThan(0.2);
});

it('sources.md 3, US Army TC 9-62 paragraphs 4-10 and 4-11 [seen]: 115 V rms, half wave, peak 162.6 V, average 51.7 V', async () => {
  const volts = await engine.waveform('tran', [
    `V1 a 0 SIN(0 ${115 * Math.SQRT2} 60)`, 'D1 a b DI', 'R1 b 0 1k', idealDiode, '.tran 20u 50m 0 20u', '.save v(b)',
  ], 'v(b)');
  const { max, mean } = rangeFrom(volts, 0);
  expect(percentOff(max, 162.6)).toBeLessThan(0.1);
  expect(percentOff(mean, 51.7)).toBeLessThan(0.5);
});

it('sources.md 3, capacitor-input filter, 230 V, 0.1 Ω, 470 µF, 1 A [run]: 304.7 to 323.4 V, 18.66 V of ripple, mean 314.4 V', async () => {
  const volts = await engine.waveform('tran', [
    'V1 a b SIN(0 325.27 50)', 'Rref b 0 1meg', 'Rs a a1 0.1', 'D1 a1 p DR', 'D2 b p DR', 'D3 0 a1 DR', 'D4 0 b DR',
    'C1 p 0 470u', 'I1 p 0 1', '.model DR D(IS=6e-8 N=2 RS=0.05)', '.tran 50u 200m 0 50u', '.save v(p)',
  ], 'v(p)');
  const { min, max, mean } = rangeFrom(volts, 0.14);
  expect(percentOff(max, 323.4)).toBeLessThan(0.5);
  expect(percentOff(min, 304.7)).toBeLessThan(0.5);
  expect(percentOff(max - min, 18.66)).toBeLessThan(2);
  expect(percentOff(mean, 314.4)).toBeLessThan(0.5);
});

it('sources.md 9.3, 22.118 mH with 20.456 pF [run]: series resonance at 236 612 Hz', async () => {
  const response = await engine.waveform(
    'ac', ['V1 a 0 AC 1', 'R1 a b 10', 'L1 b c 22.118m', 'C1 c 0 20.456p', '.ac lin 4001 235k 238k'], 'v(c)',
  );
  const peak = response.axis[response.values.indexOf(rangeFrom(response, 0).max)] ?? 0;
  expect(percentOff(peak, 236_612)).toBeLessThan(0.001);
});

it('sources.md 9.3, 100 µH with 100 nF [calc]: resonance at 50 329 Hz', async () => {
  const response = await engine.waveform(
    'ac', ['V1 a 0 AC 1', 'R1 a b 0.1', 'L1 b c 100u', 'C1 c 0 100n', '.ac lin 4001 50k 50.7k'], 'v(c)',
  );
  const peak = response.axis[response.values.indexOf(rangeFrom(response, 0).max)] ?? 0;
  expect(percentOff(peak, 50_329)).toBeLessThan(0.005);
});
