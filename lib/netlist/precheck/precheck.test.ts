import { describe, expect, it } from 'vitest';
import type { KindId } from '../kinds/kind-id';
import type { Facts, NetlistPart } from '../netlist';
import { barePart as part, bareTwoPin as two } from '../testing/bare-netlist';
import { precheck, type PrecheckCode } from './precheck';

const source = (ref: string, from: string, to: string, facts: Facts = {}): NetlistPart =>
  part('dc-source', ref, { '+': from, '-': to }, { value: 12, ...facts });
const junction = (kind: KindId, ref: string, from: string, to: string): NetlistPart => part(kind, ref, { A: from, K: to });
const fet = (ref: string, d: string, g: string, s: string): NetlistPart => part('nmos', ref, { D: d, G: g, S: s });

/** A supply, an indicator and a switch whose gate `g` each case ties or leaves. */
const stage = [source('V1', 'v', '0'), two('resistor', 'R1', 'v', 'x'), junction('led', 'D1', 'x', 'd'), fet('Q1', 'd', 'g', '0')];

const codesOf = (parts: readonly NetlistPart[]): readonly PrecheckCode[] =>
  [...new Set(precheck(parts).findings.map(({ code }) => code))].sort();

/** The ten nets of docs/engine.md 3.6, with what each must give. */
describe('the driver stage', () => {
  it.each<[string, readonly NetlistPart[], readonly PrecheckCode[]]>([
    ['with a pull-down', [two('resistor', 'R2', 'g', '0')], []],
    ['with a series resistor to a lifted lead', [two('resistor', 'R2', 'g', 'ctl')], ['LONE_PIN', 'NO_DC_PATH', 'UNDRIVEN']],
    ['with a capacitor only', [two('capacitor', 'C1', 'g', '0')], ['NO_DC_PATH', 'UNDRIVEN']],
    ['with a zener only', [junction('zener', 'D2', '0', 'g')], ['WEAK_DRIVE']],
    ['on a totem pole of channels', [
      fet('Q2', 'v', 'h', 'g'), fet('Q3', 'g', 'h', '0'), two('resistor', 'R3', 'h', '0'),
    ], ['WEAK_DRIVE']],
    ['driven', [two('resistor', 'R2', 'g', 'ctl'), source('V2', 'ctl', '0')], []],
    ['with two sources in parallel', [two('resistor', 'R2', 'g', '0'), source('V2', 'v', '0')], ['V_OR_L_LOOP']],
    ['with a coil straight across the source', [two('resistor', 'R2', 'g', '0'), two('inductor', 'L1', 'v', '0')], ['V_OR_L_LOOP']],
    ['beside an isolated secondary', [
      two('resistor', 'R2', 'g', '0'), source('V9', 's1', 's2'), two('resistor', 'R9', 's1', 's2'),
    ], ['ISLAND']],
    ['beside a capacitor fed by a current source', [
      two('resistor', 'R2', 'g', '0'), part('box', 'I1', { 1: '0', 2: 'q' }, { element: 'I', value: 1e-3 }), two('capacitor', 'C1', 'q', '0'),
    ], ['NO_DC_PATH']],
  ])('%s', (_, parts, codes) => {
    expect(codesOf([...stage, ...parts])).toEqual(codes);
  });
});

describe('a ring of sources', () => {
  it('names every part of it', () => {
    const { findings } = precheck([
      source('V1', 'a', '0'), two('inductor', 'L1', 'a', 'b'), two('air-core-coil', 'L2', 'b', '0'), two('resistor', 'R1', 'a', '0'),
    ]);
    expect(findings.map(({ parts }) => parts)).toEqual([['V1', 'L1', 'L2']]);
  });

  it.each([
    ['a source resistance', source('V2', 'v', '0', { rs: 0.1 })],
    ['a current limit', source('V2', 'v', '0', { ilim: 1 })],
    ['a winding resistance', two('inductor', 'L1', 'v', '0', { dcr: 0.5 })],
  ])('is broken by %s', (_, second) => {
    expect(codesOf([source('V1', 'v', '0'), second])).toEqual([]);
  });

  it('is no ring of coils alone', () => {
    expect(codesOf([source('V1', 'v', '0', { rs: 1 }), two('inductor', 'L1', 'v', '0'), two('inductor', 'L2', 'v', '0')])).toEqual([]);
  });

  it('has its shortest form in a source on itself', () => {
    expect(codesOf([source('V1', 'v', 'v'), two('resistor', 'R1', 'v', '0'), two('resistor', 'R2', 'v', '0')])).toEqual(['V_SHORTED']);
  });
});

it('says that nothing stands on 0 V', () => {
  expect(codesOf([source('V1', 'a', 'b'), two('resistor', 'R1', 'a', 'b')])).toEqual(['ISLAND', 'NO_GROUND']);
});

it('lets open switches carry nothing', () => {
  const rest = [source('V1', 'a', '0'), two('resistor', 'R1', 'a', '0'), two('resistor', 'R2', 'b', 'c'), two('resistor', 'R3', 'b', 'c')];
  expect(codesOf([...rest, two('switch', 'S1', 'a', 'b')])).toEqual(['NO_DC_PATH']);
  expect(codesOf([...rest, two('switch', 'S1', 'a', 'b', { closed_switch: true })])).toEqual([]);
});

it('ties floating mains to 0 V, as the run does', () => {
  const bridge = [
    part('ac-mains', 'V1', { L: 'l', N: 'n' }), junction('diode', 'D1', 'l', 'p'), junction('diode', 'D2', 'n', 'p'),
    junction('diode', 'D3', '0', 'l'), junction('diode', 'D4', '0', 'n'), two('resistor', 'R1', 'p', '0'),
  ];
  expect(codesOf(bridge)).toEqual([]);
});

it('calls an open base weakly driven', () => {
  const base = [source('V1', 'v', '0'), two('resistor', 'R1', 'v', 'c'), part('npn', 'Q1', { B: 'b', C: 'c', E: '0' })];
  expect(precheck(base).weakControls.map(({ net }) => net)).toEqual(['b']);
  expect(codesOf([...base, two('resistor', 'R2', 'b', '0')])).toEqual([]);
});
