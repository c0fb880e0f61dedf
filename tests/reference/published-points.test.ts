import { describe, expect, it } from 'vitest';
import type { Facts, ModelCard } from '@/lib/netlist/netlist';
import { ledModel } from '@/lib/netlist/models/led-model';
import type { ModelResult } from '@/lib/netlist/models/fitted-model';
import { modelLine } from '@/lib/netlist/models/model-line';
import { mosfetModel } from '@/lib/netlist/models/mosfet-model';
import { zenerModel } from '@/lib/netlist/models/zener-model';
import { percentOff, roomTemperature, referenceEngine } from './support/reference-engine';

/** Values of docs/sources.md that are operating points. Section, source and mark stand in each title. */
const engine = referenceEngine();

function cardOf(result: ModelResult): Omit<ModelCard, 'name'> {
  if ('missing' in result) throw new Error(`missing ${result.missing}`);
  return result.card;
}

describe('sources.md 13, VDMOS equations, ngspice manual 39 section 11.3 [run]', () => {
  const amps = async (drain: number): Promise<number> => -((await engine.point(
    ['Vd d 0 ' + drain, 'Vg g 0 5', 'M1 d g 0 NM', '.model NM VDMOS(VTO=3 KP=20)'], ['i(vd)'],
  ))['i(vd)'] ?? 0);

  it('saturated, V_GS 5 V, V_DS 20 V: 40.000 A', async () => {
    expect(await amps(20)).toBeCloseTo(40, 3);
  });
  it('triode, V_DS 0.1 V: 3.900 A', async () => {
    expect(await amps(0.1)).toBeCloseTo(3.9, 3);
  });
});

describe('sources.md 13, VDMOS gate-drain capacitance, ngspice manual 39 section 11.3 [run]', () => {
  const card = '.model NM VDMOS(VTO=3 KP=20 CGDMAX=2.45n CGDMIN=10p A=0.3 CJO=1.5n VJ=0.8 M=0.5 RG=1m)';
  const picofarads = async (volts: number, gate: number, drain: number): Promise<number> => {
    const current = await engine.waveform('ac', [
      `Vg g 0 DC 0 AC ${gate}`, `Vd d 0 DC ${volts} AC ${drain}`, 'M1 d g 0 NM', card, '.ac lin 1 1e5 1e5',
    ], 'i(vd)');
    return ((current.values[0] ?? 0) / (2 * Math.PI * 1e5)) * 1e12;
  };

  it.each([[0, 1500.88], [1, 1224.25], [5, 568.09], [10, 315.38], [25, 135.81], [100, 41.63]])(
    'at V_DS %d V: %f pF', async (volts, expected) => {
      expect(percentOff(await picofarads(volts, 1, 0), expected)).toBeLessThan(0.02);
    },
  );
  it('with the body capacitance at 25 V: 399.94 pF', async () => {
    expect(percentOff(await picofarads(25, 0, 1), 399.94)).toBeLessThan(0.02);
  });
});

describe('sources.md 13, diode cards at 27 °C [seen card, run value]', () => {
  it.each([
    ['public 1N4148 card', 'IS=222p N=1.65 RS=68.6m', 1e-3, 0.653907],
    ['public 1N4148 card', 'IS=222p N=1.65 RS=68.6m', 10e-3, 0.752792],
    ['public 1N4148 card', 'IS=222p N=1.65 RS=68.6m', 100e-3, 0.857234],
    ['second card', 'IS=4.352n N=1.906 RS=0.6458', 10e-3, 0.728556],
  ])('%s (%s) at %f A: %f V', async (_, card, amps, volts) => {
    const values = await engine.point([`I1 0 a ${amps}`, 'D1 a 0 DX', `.model DX D(${card})`], ['v(a)']);
    expect(values['v(a)']).toBeCloseTo(volts, 5);
  });
});

describe('sources.md 7, LED and resistor', () => {
  it.each([
    ['9 V, red 2 V at 20 mA, 390 Ω: 17.9 mA [seen, resistorworld.com.au]', 9, 390, 17.9e-3],
    ['5 V, red 2 V at 20 mA, 150 Ω: 20 mA, 0.06 W [seen, calcflo.com]', 5, 150, 20e-3],
    ['12 V, red 2 V at 20 mA, 560 Ω: 17.9 mA, 0.179 W [calc]', 12, 560, 17.9e-3],
  ])('%s', async (_, volts, ohms, amps) => {
    const led = cardOf(ledModel({ colour: 'red', vf: 2, i_test: 20e-3 }));
    const values = await engine.point(
      [roomTemperature, `V1 v 0 ${volts}`, `R1 v a ${ohms}`, 'D1 a 0 DL', modelLine('DL', led)], ['i(v1)'],
    );
    expect(percentOff(-(values['i(v1)'] ?? 0), amps)).toBeLessThan(0.5);
  });

  it.each([
    ['red', 1.7, 2], ['yellow', 1.9, 2.2], ['green', 2, 3], ['blue', 3, 3.5], ['white', 3, 3.5],
  ])('%s has its default in the range %f to %f V at 20 mA [seen, calcflo.com]', async (colour, low, high) => {
    const values = await engine.point(
      [roomTemperature, 'I1 0 a 20m', 'D1 a 0 DL', modelLine('DL', cardOf(ledModel({ colour })))], ['v(a)'],
    );
    expect(values['v(a)']).toBeGreaterThanOrEqual(low);
    expect(values['v(a)']).toBeLessThanOrEqual(high);
  });
});

describe('sources.md 12.2, zeners 1N4728 to 1N4751 [seen, dtsheet.com/doc/1460972]: V_Z and Z_ZT at I_ZT', () => {
  it.each([
    ['1N4728', 3.3, 76, 10], ['1N4733', 5.1, 49, 7], ['1N4735', 6.2, 41, 2], ['1N4739', 9.1, 28, 5], ['1N4740', 10, 25, 7],
    ['1N4742', 12, 21, 9], ['1N4744', 15, 17, 14], ['1N4749', 24, 10.5, 25], ['1N4751', 30, 8.5, 40],
  ])('%s: %f V at %f mA, %f Ω', async (_, vz, milliamps, zz) => {
    const izt = milliamps / 1e3;
    const line = modelLine('DZ', cardOf(zenerModel({ vz, i_test: izt, zz })));
    const at = async (amps: number): Promise<number> =>
      (await engine.point([roomTemperature, `I1 0 a ${amps}`, 'D1 0 a DZ', line], ['v(a)']))['v(a)'] ?? 0;
    expect(percentOff(await at(izt), vz)).toBeLessThan(0.02);
    expect(percentOff(((await at(1.02 * izt)) - (await at(0.98 * izt))) / (0.04 * izt), zz)).toBeLessThan(0.2);
  });
});

describe('sources.md 12.3, 2N7000 [seen, dtsheet.com/doc/1302789]', () => {
  const facts: Facts = {
    vds_max: 60, vgs_max: 20, vth_min: 0.8, vth_typ: 2.1, vth_max: 3, rds_on: 5, rds_on_spec_vgs: 10, id_max: 0.2, vsd: 0.85,
  };

  it.each([['min', 0.8], ['typ', 2.1], ['max', 3]] as const)('conducts 250 µA at the %s threshold of %f V', async (corner, volts) => {
    const line = modelLine('NM', cardOf(mosfetModel(facts, 'n', corner)));
    const values = await engine.point([roomTemperature, `Vd d 0 ${volts}`, `Vg g 0 ${volts}`, 'M1 d g 0 NM', line], ['i(vd)']);
    expect(percentOff(-(values['i(vd)'] ?? 0), 250e-6)).toBeLessThan(0.05);
  });

  it('loses no more than 5 Ω at 10 V in every corner', async () => {
    for (const corner of ['min', 'typ', 'max'] as const) {
      const line = modelLine('NM', cardOf(mosfetModel(facts, 'n', corner)));
      const values = await engine.point([roomTemperature, 'I1 0 d 0.1', 'Vg g 0 10', 'M1 d g 0 NM', line], ['v(d)']);
      expect(percentOff((values['v(d)'] ?? 0) / 0.1, 5)).toBeLessThan(0.05);
    }
  });
});
