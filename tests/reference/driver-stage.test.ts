import { afterAll, describe, expect, it } from 'vitest';
import type { DeckOptions } from '@/lib/netlist/engine-deck/build-engine-deck';
import type { PartSettings } from '@/lib/netlist/engine-deck/effective-part';
import { runPoint } from '@/lib/netlist/engine-deck/run-point';
import type { Facts, Netlist, NetlistPart } from '@/lib/netlist/netlist';
import type { OperatingPoint, Refusal } from '@/lib/netlist/points/point';
import { bareNetlist, barePart, bareTwoPin } from '@/lib/netlist/testing/bare-netlist';
import { createNodeEngine } from '@/lib/spice/node-engine';

const engine = createNodeEngine();
afterAll(() => engine.dispose());

async function point(netlist: Netlist, settings: PartSettings, rest: Partial<DeckOptions> = {}): Promise<OperatingPoint> {
  const run = await runPoint(engine, netlist, { settings, corner: 'typ', ...rest });
  if (run.status !== 'ok') throw new Error(run.refusal.words);
  return run.op;
}
async function refusal(netlist: Netlist, settings: PartSettings): Promise<Refusal> {
  const run = await runPoint(engine, netlist, { settings, corner: 'typ' });
  if (run.status === 'ok') throw new Error('was not refused');
  return run.refusal;
}
const resistor = (ref: string, from: string, to: string, ohms: number): NetlistPart => bareTwoPin('resistor', ref, from, to, { value: ohms });
const source = (ref: string, net: string, volts: number, facts: Facts = {}): NetlistPart =>
  barePart('dc-source', ref, { '+': net, '-': '0' }, { value: volts, ...facts });

/** docs/engine.md 4: 12 V supply, 6 Ω load, 100 V 37 mΩ MOSFET, 100 Ω to the gate, 10 kΩ pull-down. */
const mosfet: Facts = { vds_max: 100, vth_min: 2, vth_typ: 3, vth_max: 4, rds_on: 0.0374, rds_on_spec_vgs: 10, id_max: 32, gfs: 21, vsd: 1.2 };
const stageParts: readonly NetlistPart[] = [
  barePart('dc-supply', 'V1', { '+': 'v', '-': '0' }, { value: 12, ilim: 3 }), resistor('R1', 'v', 'd', 6),
  barePart('diode', 'D1', { A: 'd', K: 'v' }, { if_max: 1 }), barePart('nmos', 'Q1', { D: 'd', G: 'g', S: '0' }, mosfet),
  bareTwoPin('removable-lead', 'W1', 'c', 'j'), resistor('R2', 'j', 'g', 100), resistor('R3', 'g', '0', 10e3),
  barePart('signal-generator', 'G1', { '+': 'c', '-': '0' }, { high: 5, low: 0, rs: 50 }),
];
const stage = bareNetlist(stageParts);
const without = (...refs: readonly string[]): Netlist => bareNetlist(stageParts.filter(({ ref }) => !refs.includes(ref)));

describe('the driver stage of docs/engine.md 4', () => {
  it.each([['min', 0.105, 1.98], ['typ', 0.132, 1.98]] as const)('high, threshold %s: V_DS %f V', async (corner, volts, amps) => {
    const { volts: node, amps: pin } = await point(stage, { G1: { volts: 5 } }, { corner });
    expect(node.d).toBeCloseTo(volts, 2);
    expect(pin['Q1:D']).toBeCloseTo(amps, 1);
  });

  it('high, threshold max with R_DS(on) max: V_DS 0.290 V, 0.57 W', async () => {
    const worst = bareNetlist(stageParts.map((part) => (part.ref === 'Q1' ? { ...part, facts: { ...mosfet, rds_on: 0.044 } } : part)));
    const { volts, amps } = await point(worst, { G1: { volts: 5 } }, { corner: 'max' });
    expect(volts.d).toBeCloseTo(0.29, 1);
    expect((volts.d ?? 0) * (amps['Q1:D'] ?? 0)).toBeCloseTo(0.57, 1);
  });

  it('high at 10 V: V_DS 0.074 V at the smallest threshold', async () => {
    expect((await point(stage, { G1: { volts: 10 } }, { corner: 'min' })).volts.d).toBeCloseTo(0.074, 2);
  });

  it('low: gate at 0 V, off', async () => {
    const { volts, amps } = await point(stage, { G1: { volts: 0 } });
    expect(volts.g).toBeCloseTo(0, 6);
    expect(amps['Q1:D']).toBeLessThan(5e-6);
  });

  it('lifted: the pull-down keeps the gate at 0 V, I_GSS of 100 nA moves it by 1.000 mV either way', async () => {
    const lifted: PartSettings = { W1: { removed: true }, G1: { volts: 5 } };
    expect((await point(stage, lifted)).volts.g).toBeCloseTo(0, 9);
    const leaky = bareNetlist(stageParts.map((part) => (part.ref === 'Q1' ? { ...part, facts: { ...mosfet, igss: 100e-9 } } : part)));
    expect((await point(leaky, lifted, { gateLeakage: 1 })).volts.g).toBeCloseTo(1e-3, 8);
    expect((await point(leaky, lifted, { gateLeakage: -1 })).volts.g).toBeCloseTo(-1e-3, 8);
  });

  it('lifted without a pull-down: not simulated, undriven', async () => {
    expect(await refusal(without('R3'), { W1: { removed: true } })).toMatchObject({ code: 'precheck', parts: ['Q1'] });
  });

  it('supply 10 % up and down at 10 V of drive: 2.180 A and 1.786 A', async () => {
    expect((await point(stage, { G1: { volts: 10 }, V1: { volts: 13.2 } }, { corner: 'max' })).amps['Q1:D']).toBeCloseTo(2.18, 2);
    expect((await point(stage, { G1: { volts: 10 }, V1: { volts: 10.8 } })).amps['Q1:D']).toBeCloseTo(1.786, 2);
  });

  it('supply limited to 1 A: 6.04 V, and says so', async () => {
    const { volts, limited } = await point(stage, { G1: { volts: 10 }, V1: { amps: 1 } });
    expect(volts.v).toBeCloseTo(6.04, 1);
    expect(limited).toEqual(['V1']);
  });
});

describe('the bench supply of docs/engine.md 3.5, 12 V, 0.5 A', () => {
  const supply = barePart('dc-supply', 'V1', { '+': 'p', '-': '0' }, { value: 12, ilim: 0.5 });
  it.each([
    ['open', [], 12, []],
    ['1 kΩ', [resistor('R1', 'p', '0', 1e3)], 11.99988, []],
    ['just over the limit', [resistor('R1', 'p', '0', 23.9)], 11.94971, ['V1']],
    ['10 Ω', [resistor('R1', 'p', '0', 10)], 4.99995, ['V1']],
    ['1 mΩ', [resistor('R1', 'p', '0', 1e-3)], 0.5e-3, ['V1']],
    ['fed back from 14 V', [source('V2', 'b', 14), resistor('R2', 'b', 'p', 100)], 12.0002, []],
  ] as const)('%s', async (_, load, volts, limited) => {
    const run = await point(bareNetlist([supply, ...load]), {});
    expect(run.volts.p).toBeCloseTo(volts, 4);
    expect(run.limited).toEqual(limited);
  });

  it('limits below 0 V as well', async () => {
    const negative = barePart('dc-supply', 'V1', { '+': 'p', '-': '0' }, { value: -12, ilim: 0.5 });
    expect((await point(bareNetlist([negative, resistor('R1', 'p', '0', 10)]), {})).volts.p).toBeCloseTo(-4.99995, 4);
  });

  it('lets its limit be lifted', async () => {
    expect((await point(bareNetlist([supply, resistor('R1', 'p', '0', 10)]), { V1: { amps: null } })).amps['R1:1']).toBeCloseTo(1.2, 6);
  });
});

it('the 50 Ω generator of docs/engine.md 3.5: 10 V open, 9.523 V at 1 kΩ, 5 V at 50 Ω', async () => {
  for (const [ohms, volts] of [[1e6, 9.9995], [1e3, 9.5238], [50, 5]] as const) {
    const generator = barePart('signal-generator', 'G1', { '+': 'o', '-': '0' }, { high: 10, low: 0, rs: 50 });
    expect((await point(bareNetlist([generator, resistor('R1', 'o', '0', ohms)]), { G1: { volts: 10 } })).volts.o).toBeCloseTo(volts, 3);
  }
});

describe('gates that reach 0 V through junctions or channels only (docs/engine.md 3.6)', () => {
  const switched: readonly NetlistPart[] = [source('V1', 'v', 12), resistor('R1', 'v', 'd', 1e3), barePart('nmos', 'Q1', { D: 'd', G: 'g', S: '0' }, mosfet)];

  it.each([
    ['a zener alone', [barePart('zener', 'D2', { A: '0', K: 'g' }, { vz: 12 })]],
    ['two zeners back to back', [barePart('zener', 'D2', { A: 'm', K: 'g' }, { vz: 12 }), barePart('zener', 'D3', { A: 'm', K: '0' }, { vz: 12 })]],
    ['an open drain that is off', [barePart('nmos', 'Q2', { D: 'g', G: 'h', S: '0' }, mosfet), resistor('R4', 'h', '0', 1e4)]],
  ])('%s does not drive one', async (_, parts) => {
    expect(await refusal(bareNetlist([...switched, ...parts]), {})).toMatchObject({ code: 'precheck', nodes: ['g'], parts: ['Q1'] });
  });

  it('a totem pole does, and an open drain that is on', async () => {
    const upper = barePart('pmos', 'Q2', { D: 'g', G: 'h', S: 'v' }, mosfet);
    const lower = barePart('nmos', 'Q3', { D: 'g', G: 'h', S: '0' }, mosfet);
    const driven = await point(bareNetlist([...switched, upper, lower, source('V3', 'h', 0)]), {});
    expect(driven.volts.g).toBeCloseTo(12, 3);
    const held = await point(bareNetlist([...switched, lower, source('V3', 'h', 12)]), {});
    expect(held.volts.g).toBeCloseTo(0, 3);
  });

  it.each([0, 5])('a pair of transistors, the second base on the first emitter, is driven at %d V', async (volts) => {
    const pair: readonly NetlistPart[] = [
      source('V1', 'v', 12), source('V2', 'p', volts), resistor('R1', 'p', 'b', 10e3), resistor('R2', 'v', 'c', 100), resistor('R3', 'b', '0', 10e3),
      barePart('npn', 'Q1', { C: 'c', B: 'b', E: 'm' }, { hfe_min: 100 }), barePart('npn', 'Q2', { C: 'c', B: 'm', E: '0' }, { hfe_min: 100 }),
      resistor('R4', 'm', '0', 100e3),
    ];
    const run = await point(bareNetlist(pair), {});
    expect(run.volts.c).toBeCloseTo(volts === 0 ? 12 : 0.9, 0);
  });

  it('an open base is refused, one behind a resistor from a source is not', async () => {
    const base: readonly NetlistPart[] = [source('V1', 'v', 12), resistor('R1', 'v', 'c', 1e3), barePart('npn', 'Q1', { C: 'c', B: 'b', E: '0' }, { hfe_min: 100 })];
    expect(await refusal(bareNetlist(base), {})).toMatchObject({ parts: ['Q1'] });
    expect((await point(bareNetlist([...base, source('V2', 'p', 5), resistor('R2', 'p', 'b', 4.7e3)]), {})).volts.c).toBeLessThan(0.3);
  });
});

describe('mains at one of its peaks', () => {
  const mains = barePart('ac-mains', 'V1', { L: 'l', N: 'n' }, { rms: 230, f: 50 });
  const bridge = [['D1', 'l', 'p'], ['D2', 'n', 'p'], ['D3', '0', 'l'], ['D4', '0', 'n']]
    .map(([ref = '', from = '', to = '']) => barePart('diode', ref, { A: from, K: to }, { if_max: 1 }));
  const rectifier = bareNetlist([
    mains, ...bridge, barePart('polarised-capacitor', 'C1', { '+': 'p', '-': '0' }, { value: 470e-6 }), resistor('R1', 'p', '0', 1e5),
  ]);

  it.each([1, -1])('charges the rectifier the same way round, sign %d', async (sign) => {
    const run = await point(rectifier, { V1: { volts: sign * 357.8 } });
    expect(run.volts.p).toBeGreaterThan(356);
    expect(run.volts.p).toBeLessThan(357.8);
  });

  it('stands at 0 V as drawn', async () => {
    expect((await point(rectifier, {})).volts.p).toBeCloseTo(0, 3);
  });
});

describe('boxes simulated as written', () => {
  it('a current source drives its amps from its first node to its second', async () => {
    const run = await point(bareNetlist([barePart('box', 'I1', { 1: '0', 2: 'a' }, { element: 'I', value: 2e-3 }), resistor('R1', 'a', '0', 1e3)]), {});
    expect(run.volts.a).toBeCloseTo(2, 9);
    expect(run.amps['I1:1']).toBeCloseTo(2e-3, 9);
  });

  it('a subcircuit conducts as its elements do', async () => {
    const half = {
      name: 'HALF', pins: ['a', 'b', 'c'], models: [], subcircuits: [],
      elements: [['R1', 'a', 'm'], ['R2', 'm', 'b'], ['R3', 'm', 'c']].map(([name = '', from = '', to = ''], line) => (
        { letter: 'R', name, nodes: [from, to], value: 1e3, params: {}, line })),
    };
    const box = { ...barePart('box', 'X1', { 1: 'in', 2: '0', 3: 'out' }, { element: 'X' }), model: 'half' };
    const run = await point(bareNetlist([source('V1', 'in', 10), box, resistor('R9', 'out', '0', 1e6)], { subcircuits: [half] }), {});
    expect(run.volts.out).toBeCloseTo(4.99251, 4);
    expect(run.amps['X1:1']).toBeCloseTo(5.0025e-3, 6);
  });
});
