import { describe, expect, it } from 'vitest';
import { diodeCard } from '@/lib/netlist/models/diode-model';
import { thermalVoltage } from '@/lib/netlist/models/fitted-model';
import { fitTwoPoints, junctionVolts } from '@/lib/netlist/models/junction-fit';
import { fitChannel } from '@/lib/netlist/models/mosfet-channel';
import { modelLine } from '@/lib/netlist/models/model-line';
import { fitZener } from '@/lib/netlist/models/zener-model';
import { nativePlot, nativePoint } from './support/native-ngspice';
import { percentOff, roomTemperature, referenceEngine } from './support/reference-engine';
import { crossing, rangeFrom, valueAt, type Waveform } from './support/waveform';

const engine = referenceEngine();

/** The same transient in Debian's ngspice. */
function nativeWaveform(lines: readonly string[], vector: string): Waveform {
  const plot = nativePlot(['reference', ...lines, '.end', ''].join('\n'));
  const [axis] = plot.real.values();
  return { axis: axis as Float64Array, values: plot.real.get(vector) as Float64Array };
}

/** Each circuit of docs/engine.md 6: its formula or handbook value, and native ngspice within 0.1 %. */
describe('worked circuits of docs/engine.md 6 that are operating points', () => {
  const led = fitTwoPoints({ volts: 1.8, amps: 2e-3 }, { volts: 2, amps: 20e-3 }, 4);
  const ledAmps = fixedPoint((amps) => (12 - junctionVolts(led, amps)) / 1000, 0.01);
  const channel = fitChannel({
    threshold: 3, thresholdCurrent: 250e-6, onResistance: 0.0374, onVolts: 10, onAmps: 16, transconductance: 21,
  });
  const { vto = 0, kp = 0, rs = 0, rd = 0 } = channel ?? {};
  const zener = fitZener({ vz: 12, izt: 5e-3, zzt: 20, forward: { volts: 0.75, amps: 10e-3 } });

  it.each([
    {
      circuit: '1 LED and 1 kΩ at 12 V: fixed point of the diode law', formula: -ledAmps, within: 0.01, vector: 'i(v1)',
      lines: ['V1 v 0 12', 'R1 v a 1k', 'D1 a 0 DL', modelLine('DL', diodeCard(led, 1.11))],
    },
    {
      circuit: '2 divider 10 kΩ, 4.7 kΩ with 100 kΩ across: 3.71786 V', formula: 3.71786, within: 0.001, vector: 'v(b)',
      lines: ['V1 a 0 12', 'R1 a b 10k', 'R2 b 0 4.7k', 'R3 b 0 100k'],
    },
    {
      circuit: '7 MOSFET on, 12 V, 2 Ω: I·R_DS(on), which was fitted at 16 A', formula: (12 * 0.0374) / 2.0374, within: 0.4, vector: 'v(d)',
      lines: ['V1 v 0 12', 'R1 v d 2', 'Vg g 0 10', 'M1 d g 0 NM', modelLine('NM', { type: 'vdmos', flags: [], params: { vto, kp, ksubthres: 0.1, rs, rd } })],
    },
    {
      circuit: '8 zener at 24 V through 1 kΩ: V_Z + Z_ZT·(I − I_ZT)', formula: 12 + 20 * ((24 - 12 + 0.1) / 1020 - 5e-3), within: 0.15, vector: 'v(a)',
      lines: ['V1 v 0 24', 'R1 v a 1k', 'D1 0 a DZ', modelLine('DZ', zener)],
    },
  ])('$circuit', async ({ lines, vector, formula, within }) => {
    const deck = [roomTemperature, ...lines];
    const measured = (await engine.point(deck, [vector]))[vector] ?? 0;
    expect(percentOff(measured, formula)).toBeLessThan(within);
    expect(percentOff(measured, nativePoint([...deck, '.op'])[vector] ?? 0)).toBeLessThan(0.1);
  });
});

describe('worked circuits of docs/engine.md 6 over time', () => {
  const both = async (lines: readonly string[], vector: string, measure: (wave: Waveform) => number): Promise<number> => {
    const deck = [roomTemperature, ...lines];
    const measured = measure(await engine.waveform('tran', deck, vector));
    expect(percentOff(measured, measure(nativeWaveform(deck, vector)))).toBeLessThan(0.1);
    return measured;
  };

  it('3 RC step of 10 V at one time constant: 6.32121 V', async () => {
    const volts = await both(['V1 a 0 PULSE(0 10 0 1n 1n 1 2)', 'R1 a b 1k', 'C1 b 0 1u', '.tran 10u 5m 0 10u'], 'v(b)', (wave) => valueAt(wave, 1e-3));
    expect(percentOff(volts, 10 * (1 - Math.exp(-1)))).toBeLessThan(0.001);
  });

  describe('4 coil of 0.1 H and 100 Ω with a flyback diode', () => {
    const diode = fitTwoPoints({ volts: 0.75, amps: 0.1 }, { volts: 1, amps: 1 }, 2);
    const relay = [
      'V1 v 0 12', 'S1 v x c 0 SW', '.model SW SW(RON=1m ROFF=1e9 VT=2.5 VH=0.1)', 'Vc c 0 PULSE(5 0 10m 100n 100n 1 2)',
      'L1 x y 100m', 'R1 y 0 100', 'D1 0 x DF', modelLine('DF', diodeCard(diode, 1.11)), '.tran 5u 15m 0 5u', '.save v(x) i(l1)',
    ];

    it('4a falls from 120 mA to 60 mA as an integration of L·di/dt has it', async () => {
      let [amps, seconds] = [0.12, 0];
      const [step, slope] = [1e-7, (current: number): number => -(100 * current + junctionVolts(diode, current)) / 0.1];
      for (; amps > 0.06; seconds += step) amps += step * slope(amps + (step / 2) * slope(amps));
      const measured = await both(relay, 'i(l1)', (wave) => crossing(wave, 0.06, 'down', 9.9e-3) - 10e-3);
      expect(percentOff(measured, seconds)).toBeLessThan(0.02);
    });

    it('4b clamps the switch node one forward voltage below 0 V', async () => {
      const measured = await both(relay, 'v(x)', (wave) => valueAt(wave, 10.01e-3));
      expect(percentOff(measured, -junctionVolts(diode, 0.12 * Math.exp(-0.0106)))).toBeLessThan(0.01);
    });
  });

  describe('5 bridge, 12 V rms, 50 Hz, 1 mF, 0.1 A', () => {
    const bridge = [
      `V1 a b SIN(0 ${12 * Math.SQRT2} 50)`, 'Rref b 0 1meg', 'Rs a a1 0.1', 'D1 a1 p DR', 'D2 b p DR', 'D3 0 a1 DR', 'D4 0 b DR',
      'C1 p 0 1000u', 'I1 p 0 0.1', '.model DR D(IS=6e-8 N=2 RS=0.146)', '.tran 50u 200m 0 50u', '.save v(p)',
    ];

    it('has 0.813 V of ripple by an independent time stepping; the handbook\'s I/(2fC) overstates it', async () => {
      const measured = await both(bridge, 'v(p)', (wave) => {
        const { min, max } = rangeFrom(wave, 0.16);
        return max - min;
      });
      expect(percentOff(measured, steppedRipple())).toBeLessThan(0.1);
      expect(0.1 / (2 * 50 * 1e-3) / measured).toBeCloseTo(1.23, 2);
    });
  });

  it('6 gate RC of 50 Ω and 1.96 nF: 10 to 90 % in 215.33 ns', async () => {
    const rise = await both(
      ['V1 a 0 PULSE(0 10 10n 10p 10p 1 2)', 'R1 a g 50', 'C1 g 0 1.96n', '.tran 0.5n 1u 0 0.5n'], 'v(g)',
      (wave) => crossing(wave, 9, 'up') - crossing(wave, 1, 'up'),
    );
    expect(percentOff(rise, Math.log(9) * 50 * 1.96e-9)).toBeLessThan(0.01);
  });

  it('10a Miller step of 5 V/ns for 20 ns through 40 pF into 10 Ω and 1.92 nF: 1.2791 V, not R·C·dv/dt', async () => {
    const peak = await both(
      ['Vd d 0 PULSE(0 100 10n 20n 20n 1u 2u)', 'Cgd d g 40p', 'Cgs g 0 1.92n', 'Rg g 0 10', '.tran 0.05n 60n 0 0.05n'], 'v(g)',
      (wave) => rangeFrom(wave, 0).max,
    );
    expect(percentOff(peak, 10 * 40e-12 * 5e9 * (1 - Math.exp(-20e-9 / (10 * 1.96e-9))))).toBeLessThan(0.01);
  });

  it('10b slow ramp of 0.1 V/ns: R·C_rss·dv/dt = 40 mV', async () => {
    const peak = await both(
      ['Vd d 0 PULSE(0 100 10n 1u 1u 10u 20u)', 'Cgd d g 40p', 'Cgs g 0 1.92n', 'Rg g 0 10', '.tran 1n 1.2u 0 1n'], 'v(g)',
      (wave) => rangeFrom(wave, 0).max,
    );
    expect(percentOff(peak, 0.04)).toBeLessThan(0.01);
  });
});

it('9 series LC, 10 µH, 10 nF, 1 Ω (docs/engine.md 6): peak of Q/√(1 − 1/4Q²) at f₀·√(1 − 1/2Q²)', async () => {
  const response = await engine.waveform(
    'ac', ['V1 a 0 AC 1', 'R1 a b 1', 'L1 b c 10u', 'C1 c 0 10n', '.ac lin 4001 450k 560k'], 'v(c)',
  );
  const peak = rangeFrom(response, 0).max;
  const q = Math.sqrt(10e-6 / 10e-9);
  const f0 = 1 / (2 * Math.PI * Math.sqrt(10e-6 * 10e-9));
  expect(percentOff(peak, q / Math.sqrt(1 - 1 / (4 * q * q)))).toBeLessThan(0.01);
  expect(percentOff(response.axis[response.values.indexOf(peak)] ?? 0, f0 * Math.sqrt(1 - 1 / (2 * q * q)))).toBeLessThan(0.01);
});

function fixedPoint(next: (value: number) => number, start: number): number {
  let value = start;
  for (let step = 0; step < 200; step += 1) value = next(value);
  return value;
}

/** Ripple of circuit 5 by explicit steps of 1 µs, the diode current of each solved by Newton's method. */
function steppedRipple(): number {
  const step = 1e-6;
  let [held, amps, min, max] = [0, 0, Infinity, -Infinity];
  for (let index = 0; index < 200_000; index += 1) {
    const seconds = index * step;
    const drive = Math.abs(12 * Math.SQRT2 * Math.sin(2 * Math.PI * 50 * seconds)) - held;
    amps = drive > 0 ? bridgeAmps(drive, Math.max(amps, 1e-6)) : 0;
    held = Math.max(0, held + (step * (amps - 0.1)) / 1e-3);
    if (seconds > 0.16) [min, max] = [Math.min(min, held), Math.max(max, held)];
  }
  return max - min;
}

function bridgeAmps(drive: number, guess: number): number {
  let amps = guess;
  for (let step = 0; step < 60; step += 1) {
    const excess = 2 * (2 * thermalVoltage * Math.log1p(amps / 6e-8) + 0.146 * amps) + 0.1 * amps - drive;
    const slope = 2 * ((2 * thermalVoltage) / (amps + 6e-8) + 0.146) + 0.1;
    const next = amps - excess / slope;
    amps = next > 0 ? next : amps / 10;
  }
  return amps;
}
