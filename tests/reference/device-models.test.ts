import { describe, expect, it } from 'vitest';
import { diodeCard } from '@/lib/netlist/models/diode-model';
import { fitBipolar } from '@/lib/netlist/models/bipolar-model';
import { fitOnePoint, fitTwoPoints, type JunctionFit } from '@/lib/netlist/models/junction-fit';
import { ledModel } from '@/lib/netlist/models/led-model';
import { modelLine } from '@/lib/netlist/models/model-line';
import { fitZener } from '@/lib/netlist/models/zener-model';
import { percentOff, roomTemperature, referenceEngine } from './support/reference-engine';

const engine = referenceEngine();

describe('junctions of docs/engine.md 3.2 carry their sheet points in the engine, within 0.01 %', () => {
  const parts: readonly (readonly [string, JunctionFit, readonly (readonly [number, number])[]])[] = [
    ['red LED', fitTwoPoints({ volts: 1.8, amps: 2e-3 }, { volts: 2, amps: 20e-3 }, 4), [[1.8, 2e-3], [2, 20e-3]]],
    ['white LED', fitTwoPoints({ volts: 2.8, amps: 5e-3 }, { volts: 3.2, amps: 20e-3 }, 4), [[2.8, 5e-3], [3.2, 20e-3]]],
    ['green GaP LED', fitOnePoint({ volts: 2.2, amps: 20e-3 }, 2, 10), [[2.2, 20e-3]]],
    ['blue LED', fitOnePoint({ volts: 3.2, amps: 20e-3 }, 3, 10), [[3.2, 20e-3]]],
    ['infrared LED', fitOnePoint({ volts: 1.3, amps: 20e-3 }, 1.6, 3), [[1.3, 20e-3]]],
    ['1N4148', fitTwoPoints({ volts: 0.62, amps: 1e-3 }, { volts: 0.72, amps: 10e-3 }, 2), [[0.62, 1e-3], [0.72, 10e-3]]],
    ['1N4007', fitTwoPoints({ volts: 0.75, amps: 0.1 }, { volts: 1, amps: 1 }, 2), [[0.75, 0.1], [1, 1]]],
    ['1N5819', fitTwoPoints({ volts: 0.45, amps: 0.1 }, { volts: 0.6, amps: 1 }, 1.2), [[0.45, 0.1], [0.6, 1]]],
  ];
  const points = parts.flatMap(([part, fit, sheet]) => sheet.map(([volts, amps]) => ({ part, fit, volts, amps })));

  it.each(points)('$part: $volts V at $amps A', async ({ fit, volts, amps }) => {
    const values = await engine.point(
      [roomTemperature, `I1 0 a ${amps}`, 'D1 a 0 DX', modelLine('DX', diodeCard(fit, 1.11))], ['v(a)'],
    );
    expect(percentOff(values['v(a)'] ?? 0, volts)).toBeLessThan(0.01);
  });
});

it.each(['infrared', 'red', 'green', 'white'])('a %s LED loses 2 mV/K when the ambient rises (common practice, no source)', async (colour) => {
  const at = async (celsius: number): Promise<number> => (await engine.point(
    [`.options temp=${celsius} tnom=25 reltol=1e-4`, 'I1 0 a 20m', 'D1 a 0 DL', modelLine('DL', ledModel({ colour }).card)], ['v(a)'],
  ))['v(a)'] ?? 0;
  expect(((await at(35)) - (await at(25))) / 10).toBeCloseTo(-2e-3, 3);
});

describe('zeners of docs/engine.md 3.2 in the engine', () => {
  const forward = { volts: 0.75, amps: 10e-3 };
  const sheets = [
    { part: '12 V 5 mA', vz: 12, izt: 5e-3, zzt: 20, knee: { zzk: 90, izk: 1e-3 }, kneeSeen: 90 },
    { part: '1N4742 12 V', vz: 12, izt: 21e-3, zzt: 9, knee: { zzk: 700, izk: 0.25e-3 }, kneeSeen: 700 },
    { part: '5.1 V 5 mA', vz: 5.1, izt: 5e-3, zzt: 35, knee: { zzk: 550, izk: 1e-3 }, kneeSeen: 174 },
    { part: '15 V 5 mA', vz: 15, izt: 5e-3, zzt: 30 },
  ];
  const voltsAt = async (card: ReturnType<typeof fitZener>, amps: number): Promise<number> =>
    (await engine.point([roomTemperature, `I1 0 a ${amps}`, 'D1 0 a DZ', modelLine('DZ', card)], ['v(a)']))['v(a)'] ?? 0;
  const slopeAt = async (card: ReturnType<typeof fitZener>, amps: number): Promise<number> =>
    ((await voltsAt(card, amps * 1.02)) - (await voltsAt(card, amps * 0.98))) / (amps * 0.04);

  it.each(sheets)('$part: V_Z within 0.02 %, Z_ZT within 0.05 %', async ({ vz, izt, zzt, knee }) => {
    const card = fitZener({ vz, izt, zzt, knee, forward });
    expect(percentOff(await voltsAt(card, izt), vz)).toBeLessThan(0.02);
    expect(percentOff(await slopeAt(card, izt), zzt)).toBeLessThan(0.05);
  });

  it.each(sheets.flatMap((sheet) => (sheet.knee === undefined ? [] : [{ ...sheet, knee: sheet.knee, kneeSeen: sheet.kneeSeen }])))(
    '$part: Z_ZK $kneeSeen ohm, the sheet\'s unless it contradicts Z_ZT', async ({ vz, izt, zzt, knee, kneeSeen }) => {
      expect(percentOff(await slopeAt(fitZener({ vz, izt, zzt, knee, forward }), knee.izk), kneeSeen)).toBeLessThan(1);
    },
  );
});

describe('bipolar transistors of docs/engine.md 3.3 in the engine', () => {
  const sheets = [
    { part: 'BC547-like', type: 'npn', gain: 290, amps: 2e-3, gainVolts: 5, vbe: 0.66, vceSat: 0.2, satAmps: 0.1, satBaseAmps: 5e-3 },
    { part: '2N3904-like', type: 'npn', gain: 100, amps: 10e-3, gainVolts: 1, vbe: 0.69, vceSat: 0.2, satAmps: 10e-3, satBaseAmps: 1e-3 },
    { part: '2N3906-like', type: 'pnp', gain: 100, amps: 10e-3, gainVolts: 1, vbe: 0.7, vceSat: 0.25, satAmps: 10e-3, satBaseAmps: 1e-3 },
    { part: 'BD139-like', type: 'npn', gain: 100, amps: 0.15, gainVolts: 2, vbe: 0.75, vceSat: 0.5, satAmps: 0.5, satBaseAmps: 0.05 },
  ] as const;

  it.each(sheets)('$part: I_C within 0.25 %, V_BE within 0.2 %, V_CE(sat) within 0.1 %', async (sheet) => {
    const { is, bf, br, vaf, rc } = fitBipolar({ ...sheet, vbeAmps: sheet.amps });
    const model = modelLine('QX', { type: sheet.type, flags: [], params: { is, bf, br, vaf, rc } });
    const sign = sheet.type === 'pnp' ? -1 : 1;
    const active = await engine.point(
      [roomTemperature, `Vc c 0 ${sign * sheet.gainVolts}`, `Ib 0 b ${(sign * sheet.amps) / sheet.gain}`, 'Q1 c b 0 QX', model],
      ['i(vc)', 'v(b)'],
    );
    expect(percentOff(-sign * (active['i(vc)'] ?? 0), sheet.amps)).toBeLessThan(0.25);
    expect(percentOff(sign * (active['v(b)'] ?? 0), sheet.vbe)).toBeLessThan(0.2);

    const saturated = await engine.point(
      [roomTemperature, `Ic 0 c ${sign * sheet.satAmps}`, `Ib 0 b ${sign * sheet.satBaseAmps}`, 'Q1 c b 0 QX', model], ['v(c)'],
    );
    expect(percentOff(sign * (saturated['v(c)'] ?? 0), sheet.vceSat)).toBeLessThan(0.1);
  });
});
