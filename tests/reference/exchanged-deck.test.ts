import { describe, expect, test } from 'vitest';
import { buildNetlist } from '@/lib/netlist/connectivity/build-netlist';
import { pinEnd } from '@/lib/netlist/connectivity/end-key';
import type { DrawnPart } from '@/lib/netlist/connectivity/netlist-source';
import { writeDeck } from '@/lib/netlist/deck/write-deck';
import { spiceNumber } from '@/lib/netlist/deck/spice-number';
import { nativePoint } from './support/native-ngspice';
import { percentOff } from './support/reference-engine';

describe('numbers of a deck, against native ngspice (Debian)', () => {
  const texts = ['1M', '1F', '10uF', '1k', '1meg', '100nF', '20mA', '1mil', '4.7k', '50Hz', '.5', '2t', '3e-3k', '1ohm'];
  const point = nativePoint([...texts.flatMap((text, index) => [`V${index} n${index} 0 ${text}`, `R${index} n${index} 0 1`]), '.op']);

  test.each(texts.map((text, index) => [text, index] as const))('%s', (text, index) => {
    expect(percentOff(point[`v(n${index})`] as number, spiceNumber(text) as number)).toBeLessThan(1e-6);
  });
});

/** One part between a drive and 0 V: volts of its nets in the written deck, by native ngspice. */
function point(parts: readonly (Omit<DrawnPart, 'id' | 'origins' | 'leftOpen'> & { readonly on: Readonly<Record<string, string>> })[]) {
  const drawn = parts.map((part, index): DrawnPart => ({ ...part, id: `p${index}`, origins: {}, leftOpen: [] }));
  const nets = [...new Set(parts.flatMap(({ on }) => Object.values(on)))];
  const marks = nets.map((name): DrawnPart => ({ id: `m${name}`, ref: '', kind: 'net-name', facts: { name }, origins: {}, leftOpen: [] }));
  const joins = parts.flatMap(({ on }, index) => Object.entries(on).map(([pin, net]) => [pinEnd(`p${index}`, pin), pinEnd(`m${net}`, '1')] as const));
  const deck = writeDeck(buildNetlist({ title: 't', parts: [...drawn, ...marks], joins, scenarios: [], holdPoints: [], models: [], subcircuits: [] }));
  return nativePoint(deck.split('\n').slice(1).filter((line) => line !== '.end'));
}

describe('written decks in native ngspice stand where the data sheet says (docs/engine.md 3)', () => {
  const supply = (volts: number) => ({ ref: 'V1', kind: 'dc-source' as const, facts: { value: volts }, on: { '+': 'in', '-': '0' } });
  const resistor = (ohms: number, to: string) => ({ ref: 'R1', kind: 'resistor' as const, facts: { value: ohms }, on: { '1': 'in', '2': to } });

  test('LED: V_F 2 V at 20 mA', () => {
    const volts = point([supply(22), resistor(1_000, 'a'), { ref: 'D1', kind: 'led', facts: { vf: 2, i_test: 0.02, colour: 'red' }, on: { A: 'a', K: '0' } }]);
    expect(percentOff(volts['v(a)'] as number, 2)).toBeLessThan(0.1);
  });

  test('zener: 12 V at 5 mA', () => {
    const volts = point([supply(17), resistor(1_000, 'k'), { ref: 'D1', kind: 'zener', facts: { vz: 12, i_test: 5e-3, zz: 20 }, on: { K: 'k', A: '0' } }]);
    expect(percentOff(volts['v(k)'] as number, 12)).toBeLessThan(0.1);
  });

  test('N-MOSFET, LEVEL=1: R_DS(on) 37 mΩ at V_GS 10 V, and off at 0 V', () => {
    const facts = { vds_max: 100, vth_min: 2, vth_max: 4, rds_on: 0.037, rds_on_spec_vgs: 10 };
    const stage = (gate: number) => point([
      supply(10), resistor(10, 'd'), { ref: 'V2', kind: 'dc-source', facts: { value: gate }, on: { '+': 'g', '-': '0' } },
      { ref: 'Q1', kind: 'nmos', facts, on: { D: 'd', G: 'g', S: '0' } },
    ]);
    const on = stage(10)['v(d)'] as number;
    expect(percentOff(on / ((10 - on) / 10), 0.037)).toBeLessThan(1);
    expect(percentOff(stage(0)['v(d)'] as number, 10)).toBeLessThan(1e-3);
  });

  test('P-MOSFET: the same with all signs turned', () => {
    const facts = { vds_max: -100, vth_min: -2, vth_max: -4, rds_on: 0.117, rds_on_spec_vgs: -10 };
    const volts = point([supply(12), { ref: 'R1', kind: 'resistor', facts: { value: 12 }, on: { '1': 'd', '2': '0' } },
      { ref: 'V2', kind: 'dc-source', facts: { value: 2 }, on: { '+': 'g', '-': '0' } }, { ref: 'Q1', kind: 'pmos', facts, on: { D: 'd', G: 'g', S: 'in' } }]);
    const drop = 12 - (volts['v(d)'] as number);
    expect(percentOff(drop / ((12 - drop) / 12), 0.117)).toBeLessThan(1);
  });

  test('plug contact, lead, fuse and closed switch in a row drop next to nothing; an open switch takes it all', () => {
    const row = (closed: boolean) => point([
      supply(10), { ref: 'J1', kind: 'plug-contact', facts: { contact: '1' }, on: { '1': 'in', '2': 'a' } },
      { ref: 'W1', kind: 'removable-lead', facts: {}, on: { '1': 'a', '2': 'b' } }, { ref: 'F1', kind: 'fuse', facts: { value: 2 }, on: { '1': 'b', '2': 'c' } },
      { ref: 'S1', kind: 'switch', facts: { closed_switch: closed }, on: { '1': 'c', '2': 'd' } }, { ref: 'R1', kind: 'resistor', facts: { value: 10 }, on: { '1': 'd', '2': '0' } },
    ])['v(d)'] as number;
    expect(percentOff(row(true), 10)).toBeLessThan(0.05);
    expect(Math.abs(row(false))).toBeLessThan(1e-6);
  });
});
