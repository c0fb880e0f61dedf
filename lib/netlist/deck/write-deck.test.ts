import { describe, expect, test } from 'vitest';
import { buildNetlist } from '../connectivity/build-netlist';
import { pinEnd } from '../connectivity/end-key';
import type { DrawnPart } from '../connectivity/netlist-source';
import { canonicalJson, contentHash } from '../hash';
import type { FactValue, Netlist } from '../netlist';
import { randomSheet } from '../testing/random-sheet';
import { SeededRandom } from '../testing/seeded-random';
import { netlistFromDeck } from './netlist-from-deck';
import { readDeck } from './read-deck';
import { writeDeck } from './write-deck';

function readAgain(deck: string): Netlist {
  const reading = readDeck(deck);
  if (!reading.ok) throw new Error(JSON.stringify(reading.errors));
  return netlistFromDeck(reading.document).netlist;
}

function sheetOf(parts: readonly (Partial<DrawnPart> & Pick<DrawnPart, 'ref' | 'kind'>)[]): Netlist {
  const drawn = parts.map((part, index): DrawnPart => ({ id: `p${index}`, facts: {}, origins: {}, leftOpen: [], ...part }));
  return buildNetlist({ title: 'One', parts: drawn, joins: [], scenarios: [], holdPoints: [], models: [], subcircuits: [] });
}

function written(ref: string, kind: DrawnPart['kind'], facts: Record<string, FactValue> = {}): string[] {
  return writeDeck(sheetOf([{ ref, kind, facts }])).split('\n').filter((line) => !/^(One|\.options.*|\.op|\.end|)$/.test(line));
}

/** What a deck has no words for. */
function electrical(netlist: Netlist) {
  return netlist.parts.filter(({ kind }) => kind !== 'test-point').map(({ ref, kind, facts, wave }) => canonicalJson({ ref, kind, facts, wave }));
}

describe('a deck read again', () => {
  test.each(Array.from({ length: 60 }, (_, seed) => seed))('gives the same circuit, seed %i', (seed) => {
    const netlist = buildNetlist(randomSheet(30, new SeededRandom(seed)));
    const deck = writeDeck(netlist);
    const again = readAgain(deck);
    expect(electrical(again)).toEqual(electrical(netlist));
    expect(contentHash(again)).toBe(contentHash(netlist));
    expect(writeDeck(readAgain(writeDeck(again)))).toBe(writeDeck(again));
  });

  test('keeps net names that no SPICE would take', () => {
    const mark = (id: string, name: string): DrawnPart => ({ id, ref: '', kind: 'net-name', facts: { name }, origins: {}, leftOpen: [] });
    const resistor: DrawnPart = { id: 'r', ref: 'R1', kind: 'resistor', facts: { value: 1 }, origins: {}, leftOpen: [] };
    const netlist = buildNetlist({
      title: 'Names', parts: [resistor, mark('a', '12 V rail'), mark('b', 'GND')], scenarios: [], holdPoints: [], models: [], subcircuits: [],
      joins: [[pinEnd('r', '1'), pinEnd('a', '1')], [pinEnd('r', '2'), pinEnd('b', '1')]],
    });
    expect(readAgain(writeDeck(netlist)).nets.map(({ name, givenNames }) => [name, givenNames])).toEqual([['12 V rail', ['12 V rail']], ['GND', ['GND']]]);
  });
});

describe('elements', () => {
  test('a designator that lacks the letter gets it, and the fact line says so', () => {
    expect(written('W1', 'removable-lead')).toEqual(['RW1 N1 N2 0.001', '*@RW1 kind=removable-lead ref=W1']);
  });

  test('a power MOSFET is a subcircuit of Berkeley elements with its ratings in the fact line', () => {
    const lines = written('Q1', 'nmos', { vds_max: 100, vth_min: 2, vth_max: 4, rds_on: 0.1, rds_on_spec_vgs: 10, ciss: 2e-9, crss: 1e-10 });
    expect(lines).toEqual([
      'XQ1 N2 N1 N3 Q1_MOS', '.subckt Q1_MOS d g s', 'M1 d g s s Q1_MOS_CH W=1e-4 L=1e-4', 'D1 s d Q1_MOS_BD', 'CGS g s 1.9e-9', 'CGD g d 1e-10',
      '.model Q1_MOS_CH NMOS(LEVEL=1 VTO=3 KP=2.85714 RD=0.04 RS=0.01)', '.model Q1_MOS_BD D(IS=1e-12 N=1.1 BV=100 IBV=0.00025)', '.ends',
      '*@XQ1 kind=nmos ref=Q1 pins=G:N1,D:N2,S:N3 ciss=2e-9 crss=1e-10 rds_on=0.1 rds_on_spec_vgs=10 vds_max=100 vth_max=4 vth_min=2',
    ]);
  });

  test('contacts of a plug share their designator and are part of it', () => {
    const deck = writeDeck(sheetOf([{ ref: 'J1', kind: 'plug-contact', facts: { contact: '1' } }, { ref: 'J1', kind: 'plug-contact', facts: { contact: '2' } }]));
    expect(deck).toContain('RJ1_2 N3 N4 0.001\n*@RJ1_2 kind=plug-contact ref=J1 contact=2 part_of=J1\n');
    expect(readAgain(deck).parts.map(({ ref, facts }) => [ref, facts])).toEqual([['J1', { contact: '1' }], ['J1', { contact: '2' }]]);
  });

  test('a value that nobody gave stays missing', () => {
    expect(written('R1', 'resistor')).toEqual(['R1 N1 N2 1000', '*@R1 kind=resistor value=missing']);
    expect(readAgain(writeDeck(sheetOf([{ ref: 'R1', kind: 'resistor' }]))).parts[0]?.facts).toEqual({});
  });

  test('a generator is an ideal wave with its resistance as a fact', () => {
    expect(written('G1', 'signal-generator', { high: 11, low: 0, fsw: 25_000, rs: 50 })[0])
      .toBe('VG1 N1 N2 PULSE(0 11 0 1e-8 1e-8 0.00001999 0.00004)');
  });

  test('two parts of one designator get two element names', () => {
    expect(writeDeck(sheetOf([{ ref: 'R1', kind: 'resistor' }, { ref: 'R1', kind: 'resistor' }]))).toContain('R1_2 N3 N4 1000\n*@R1_2 kind=resistor ref=R1');
  });

  test('words cannot start a line of their own', () => {
    const lines = writeDeck({ ...sheetOf([{ ref: 'R1\n.include x', kind: 'resistor', facts: { part: 'a\nV9 1 0 5', note: 'b\n.control' } }]), title: 'T\nV8 1 0 5' }).split('\n');
    expect(lines.filter((line) => /^(V|\.include|\.control)/.test(line))).toEqual([]);
  });
});
