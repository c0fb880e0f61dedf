import { describe, expect, it } from 'vitest';
import { fitChannel, channelVolts, subthreshold, type ChannelFit } from '@/lib/netlist/models/mosfet-channel';
import { fitCharge } from '@/lib/netlist/models/mosfet-charge';
import { thermalVoltage } from '@/lib/netlist/models/fitted-model';
import { modelLine } from '@/lib/netlist/models/model-line';
import { percentOff, roomTemperature, referenceEngine } from './support/reference-engine';
import { crossing } from './support/waveform';

const engine = referenceEngine();

/** Fit targets of docs/engine.md 3.1. `gfsOff` is the error that the table states where KP had to be raised. */
interface MosfetSheet {
  readonly part: string;
  readonly p?: boolean;
  readonly vth: number;
  readonly ith?: number;
  readonly rds: number;
  readonly gate: number;
  readonly amps: number;
  readonly gfs: number;
  readonly gfsAmps?: number;
  readonly gfsOff?: number;
  readonly ciss: number;
  readonly coss: number;
  readonly crss: number;
  readonly capVolts?: number;
  readonly qg?: { readonly coulombs: number; readonly gate: number; readonly bus: number; readonly amps: number; readonly qgd?: number };
  readonly vsd: number;
  readonly vsdAmps: number;
  readonly bv: number;
}

const fet100 = {
  rds: 0.0374, gate: 10, amps: 16, gfs: 21, ciss: 1960e-12, coss: 250e-12, crss: 40e-12, vsd: 1.2, vsdAmps: 16, bv: 100,
  qg: { coulombs: 71e-9, gate: 10, bus: 80, amps: 16, qgd: 21e-9 },
};
const sheets: readonly MosfetSheet[] = [
  { part: '100 V 37 mΩ typ', vth: 3, ...fet100 },
  { part: '100 V 37 mΩ min', vth: 2, ...fet100 },
  { part: '100 V 44 mΩ max', vth: 4, ...fet100, rds: 0.044 },
  {
    part: '55 V logic level', vth: 1.5, rds: 0.022, gate: 10, amps: 25, gfs: 21, ciss: 1700e-12, coss: 400e-12, crss: 150e-12,
    qg: { coulombs: 48e-9, gate: 5, bus: 44, amps: 25 }, vsd: 1.3, vsdAmps: 25, bv: 55,
  },
  {
    part: '100 V P', p: true, vth: 3, rds: 0.117, gate: 10, amps: 11, gfs: 5.3, gfsOff: 4.1, ciss: 1300e-12, coss: 400e-12,
    crss: 240e-12, qg: { coulombs: 97e-9, gate: 10, bus: 80, amps: 11 }, vsd: 1.6, vsdAmps: 11, bv: 100,
  },
  {
    part: '500 V', vth: 4, rds: 0.27, gate: 10, amps: 12, gfs: 13, ciss: 2040e-12, coss: 300e-12, crss: 60e-12,
    qg: { coulombs: 65e-9, gate: 10, bus: 400, amps: 20 }, vsd: 1.5, vsdAmps: 20, bv: 500,
  },
  {
    part: '2N7002-like', vth: 2.1, rds: 2.8, gate: 10, amps: 0.5, gfs: 0.32, gfsAmps: 0.2, ciss: 20e-12, coss: 11e-12, crss: 4e-12,
    vsd: 0.88, vsdAmps: 0.115, bv: 60,
  },
  {
    part: 'BSS138-like', vth: 1.3, ith: 1e-3, rds: 0.7, gate: 10, amps: 0.22, gfs: 0.5, ciss: 27e-12, coss: 13e-12, crss: 6e-12,
    qg: { coulombs: 1.7e-9, gate: 10, bus: 25, amps: 0.22 }, vsd: 0.8, vsdAmps: 0.44, bv: 50,
  },
  {
    part: 'BSS84-like P', p: true, vth: 1.7, rds: 3.5, gate: 5, amps: 0.1, gfs: 0.13, gfsOff: 5.8, ciss: 30e-12, coss: 10e-12,
    crss: 5e-12, capVolts: 5, qg: { coulombs: 1.3e-9, gate: 10, bus: 40, amps: 0.1 }, vsd: 0.8, vsdAmps: 0.13, bv: 50,
  },
];

function fitted(sheet: MosfetSheet): { readonly line: string; readonly channel: ChannelFit } {
  const channel = fitChannel({
    threshold: sheet.vth, thresholdCurrent: sheet.ith ?? 250e-6, onResistance: sheet.rds, onVolts: sheet.gate, onAmps: sheet.amps,
    transconductance: sheet.gfs, transconductanceAmps: sheet.gfsAmps,
  });
  if (channel === null) throw new Error(`${sheet.part} has no fit`);
  const { qg } = sheet;
  const { from: _, ...charge } = fitCharge(
    { ciss: sheet.ciss, coss: sheet.coss, crss: sheet.crss, volts: sheet.capVolts ?? 25 },
    qg && {
      qg: qg.coulombs, qgd: qg.qgd, gateVolts: qg.gate, busVolts: qg.bus, sourceVolts: qg.amps * channel.rs,
      channelVolts: channelVolts(channel, qg.gate, qg.amps) || qg.amps * sheet.rds,
      plateau: channel.vto + Math.sqrt((2 * qg.amps) / channel.kp) + qg.amps * channel.rs,
    },
  );
  const rb = (0.15 * sheet.vsd) / sheet.vsdAmps;
  const is = sheet.vsdAmps / Math.exp((sheet.vsd - sheet.vsdAmps * rb) / (1.1 * thermalVoltage));
  const { kp, rs, rd } = channel;
  const params = {
    vto: sheet.p ? -channel.vto : channel.vto, kp, ksubthres: subthreshold, rs, rd, rg: 1e-3, ...charge, vj: 0.8, m: 0.5,
    is, n: 1.1, rb, bv: sheet.bv, ibv: 250e-6,
  };
  return { line: modelLine('NM', { type: 'vdmos', flags: sheet.p ? ['pchan'] : [], params }), channel };
}

describe.each(sheets)('MOSFET of docs/engine.md 3.1 in the engine: $part', (sheet) => {
  const { line, channel } = fitted(sheet);
  const sign = sheet.p ? -1 : 1;
  const point = async (lines: readonly string[], vector: string): Promise<number> =>
    (await engine.point([roomTemperature, ...lines, line], [vector]))[vector] ?? 0;

  it('carries the stated current at V_GS(th)', async () => {
    const amps = await point([`Vd d 0 ${sign * sheet.vth}`, `Vg g 0 ${sign * sheet.vth}`, 'M1 d g 0 NM'], 'i(vd)');
    expect(percentOff(-sign * amps, sheet.ith ?? 250e-6)).toBeLessThan(0.01);
  });

  it('has the stated R_DS(on)', async () => {
    const volts = await point([`I1 0 d ${sign * sheet.amps}`, `Vg g 0 ${sign * sheet.gate}`, 'M1 d g 0 NM'], 'v(d)');
    expect(percentOff((sign * volts) / sheet.amps, sheet.rds)).toBeLessThan(0.01);
  });

  it('has the stated g_fs, or the stated error where R_DS(on) had to be kept', async () => {
    const amps = sheet.gfsAmps ?? sheet.amps;
    const gate = channel.vto + Math.sqrt((2 * amps) / channel.kp) + amps * channel.rs;
    const at = async (volts: number): Promise<number> =>
      -sign * (await point([`Vd d 0 ${sign * 25}`, `Vg g 0 ${sign * volts}`, 'M1 d g 0 NM'], 'i(vd)'));
    const slope = ((await at(gate + 0.01)) - (await at(gate - 0.01))) / 0.02;
    expect((slope / sheet.gfs - 1) * 100).toBeCloseTo(sheet.gfsOff ?? 0, 0);
  });

  it('has the stated body diode and breakdown', async () => {
    const forward = await point([`I1 d 0 ${sign * sheet.vsdAmps}`, 'Vg g 0 0', 'M1 d g 0 NM'], 'v(d)');
    expect(percentOff(-sign * forward, sheet.vsd)).toBeLessThan(0.01);
    const breakdown = await point([`I1 0 d ${sign * 250e-6}`, 'Vg g 0 0', 'M1 d g 0 NM'], 'v(d)');
    expect(percentOff(sign * breakdown, sheet.bv)).toBeLessThan(0.2);
  });

  it('has the stated C_iss, C_rss and C_oss', async () => {
    const volts = sign * (sheet.capVolts ?? 25);
    const farads = async (gate: number, drain: number, vector: string): Promise<number> => {
      const current = await engine.waveform('ac', [
        roomTemperature, `Vg g 0 DC 0 AC ${gate}`, `Vd d 0 DC ${volts} AC ${drain}`, 'M1 d g 0 NM', line, '.ac lin 1 1e5 1e5',
      ], vector);
      return (current.values[0] ?? 0) / (2 * Math.PI * 1e5);
    };
    expect(percentOff(await farads(1, 0, 'i(vg)'), sheet.ciss)).toBeLessThan(0.02);
    expect(percentOff(await farads(1, 0, 'i(vd)'), sheet.crss)).toBeLessThan(0.02);
    expect(percentOff(await farads(0, 1, 'i(vd)'), sheet.coss)).toBeLessThan(0.02);
  });

  const { qg } = sheet;
  if (qg) it('takes the stated gate charge from a constant current, within 2 %', async () => {
    const { coulombs, gate, bus, amps } = qg;
    const drive = coulombs > 5e-9 ? 1e-3 : 1e-5;
    const time = coulombs / drive;
    const volts = await engine.waveform('tran', [
      roomTemperature, `Vdd v 0 ${sign * bus}`, `Rl v d ${bus / amps}`, `Ig 0 g PULSE(0 ${sign * drive} 0 ${time / 1e4} 1n 1 2)`,
      'Rgl g 0 1e9', 'M1 d g 0 NM', line, `.tran ${time / 2000} ${time * 1.6} 0 ${time / 1000}`, '.save v(g)',
    ], 'v(g)');
    const rising = { axis: volts.axis, values: volts.values.map((value) => sign * value) };
    expect(percentOff(crossing(rising, gate, 'up') * drive, coulombs)).toBeLessThan(2);
  });
});
