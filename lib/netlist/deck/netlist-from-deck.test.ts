import { describe, expect, test } from 'vitest';
import { contentHash } from '../hash';
import type { NetlistPart } from '../netlist';
import { netlistFromDeck } from './netlist-from-deck';
import { readDeck } from './read-deck';
import { writeDeck } from './write-deck';

function from(...lines: string[]) {
  const reading = readDeck(['title', ...lines].join('\n'));
  if (!reading.ok) throw new Error(JSON.stringify(reading.errors));
  return netlistFromDeck(reading.document);
}

function part(...lines: string[]): NetlistPart {
  return from(...lines).netlist.parts[0] as NetlistPart;
}

const power = ['.subckt FET a b c', 'R1 a b 1', 'R2 b c 1', '.ends'];

describe('kinds', () => {
  test.each<[string, string[]]>([
    ['resistor', ['R1 a b 1k']], ['capacitor', ['C1 a b 1n']], ['inductor', ['L1 a b 1u']],
    ['polarised-capacitor', ['C1 a b 1u', '*@C1 polarised=yes']], ['polarised-capacitor', ['C1 a b 1u', '*@c1 minus=A']],
    ['air-core-coil', ['L1 a b 1u', '*@L1 kind=air-core-coil']],
    ['dc-source', ['V1 a b 5']], ['dc-supply', ['V1 a b 5', '*@V1 ilim=0.5']], ['signal-generator', ['V1 a b PULSE(0 5)']],
    ['signal-generator', ['V1 a b 5', '*@V1 role=generator']], ['signal-generator', ['V1 a b SIN(0 5 1k)']],
    ['ac-mains', ['V1 a b SIN(0 325 50)', '*@V1 role=mains']], ['ac-mains', ['V1 a b 0', '*@V1 role=mains rms=230 f=50']],
    ['diode', ['D1 a b DD', '.model DD D']], ['led', ['D1 a b DD', '*@D1 kind=LED', '.model DD D']], ['led', ['D1 a b LED', '*@D1 kind=led']],
    ['zener', ['D1 a b DD', '*@D1 vz=12', '.model DD D']], ['schottky', ['D1 a b DD', '*@D1 kind=Schottky']], ['diode', ['D1 a b NOCARD']],
    ['npn', ['Q1 c b e QQ', '.model QQ NPN']], ['pnp', ['Q1 c b e QQ', '.model QQ PNP']], ['npn', ['Q1 c b e QQ', '*@Q1 kind=NPN']],
    ['nmos', ['M1 d g s s MM', '.model MM NMOS']], ['pmos', ['M1 d g s MM', '.model MM VDMOS(pchan)']], ['nmos', ['M1 d g s MM', '.model MM VDMOS(VTO=3)']],
    ['nmos', ['X1 a b c FET', '*@X1 kind=NMOS', ...power]], ['nmos', ['X1 a b c GONE', '*@X1 kind=nmos']],
    ['removable-lead', ['R1 a b 10m', '*@R1 kind=lead']], ['plug-contact', ['R1 a b 10m', '*@R1 kind=plug part_of=J1']], ['plug-contact', ['R1 a b 10m', '*@R1 part_of=J1']], ['resistor', ['R1 a b 10k', '*@R1 part_of=J1']], ['fuse', ['R1 a b 10m', '*@R1 kind=fuse value=2']], ['switch', ['R1 a b 1m', '*@R1 kind=switch']],
    ['resistor', ['R1 a b 12', '*@R1 kind=lamp']], ['resistor', ['R1 a b 5m', '*@R1 wire=yes']],
    ['box', ['I1 a b 1m']], ['box', ['X1 a b c FET', ...power]], ['box', ['E1 a b c d 2']], ['box', ['Q1 c b e NOCARD']], ['box', ['X1 a b c FET', '*@X1 kind=driver', ...power]],
    ['resistor', ['R1 a b 1k', '*@R1 kind=NMOS']], ['npn', ['Q1 c b e QQ', '*@Q1 kind=PNP', '.model QQ NPN']],
  ])('%s from %j', (kind, lines) => {
    expect(part(...lines).kind).toBe(kind);
  });
});

describe('pins', () => {
  test.each<[object, string[]]>([
    [{ G: 'g', D: '0', S: 's' }, ['X1 s g 0 FET', '*@X1 kind=NMOS pins=D:0,G:g,S:s,B:s', ...power]],
    [{ G: 'b', D: 'a', S: 'c' }, ['X1 a b c FET', '*@X1 kind=NMOS', ...power]],
    [{ G: 'a', D: 'b', S: 'c' }, ['X1 a b c FET', '*@X1 kind=NMOS', '.subckt FET g d s', 'R1 g s 1', 'R2 d s 1', '.ends']],
    [{ B: 'b', C: 'c', E: 'e' }, ['Q1 c b e QQ', '.model QQ NPN']],
    [{ '+': 'b', '-': 'a' }, ['C1 a b 1u', '*@C1 plus=b']],
    [{ '+': 'a', '-': 'b' }, ['C1 a b 1u', '*@C1 minus=B']],
    [{ A: 'b', K: 'a' }, ['D1 a b DD', '*@D1 anode=b', '.model DD D']],
    [{ A: 'b', K: 'a' }, ['D1 a b DD', '*@D1 cathode=a', '.model DD D']],
    [{ A: 'a', K: 'b' }, ['D1 a b DD', '*@D1 cathode=elsewhere', '.model DD D']],
    [{ a: 'x', b: 'y', c: 'z' }, ['X1 x y z FET', ...power]],
    [{ '+': 'x', '-': '0' }, ['I1 x GND 1m']],
  ])('%j', (pins, lines) => {
    expect(part(...lines).pins).toEqual(pins);
  });
});

test('designators are the element names, or ref=; never merged', () => {
  const { netlist } = from('m1 d g s s MM', '.model MM NMOS', 'RJ1A a b 1m', '*@RJ1A kind=plug-contact part_of=J1', 'RW1 c d 1m', '*@RW1 kind=lead ref=W1');
  expect(netlist.parts.map(({ ref, id }) => [ref, id])).toEqual([['m1', 'deck-m1'], ['RJ1A', 'deck-rj1a'], ['W1', 'deck-w1']]);
  expect(netlist.parts[1]?.facts.part_of).toBe('J1');
});

test('names that a sheet has no room for', () => {
  const long = 'p'.repeat(30);
  expect(Object.keys(part('X1 a b S', `.subckt S ${long} q`, `R1 ${long} q 1`, '.ends').pins)).toEqual(['1', '2']);
  expect(part('R1 a b 1k', `*@R1 ref=${'R'.repeat(50)}`).ref).toBe('R1');
  expect(part('R1 a b 1k', `*@R1 note=${'n'.repeat(3_000)}`).facts.note).toHaveLength(2_000);
});

describe('nets', () => {
  test('nodes keep their first spelling and no case; gnd is 0; N1 is no given name', () => {
    const { netlist } = from('R1 Gate gnd 1', 'R2 GATE n1 1', 'R3 n1 0 1');
    expect(netlist.nets.map(({ name, givenNames, pins }) => [name, givenNames, pins])).toEqual([
      ['0', [], ['R1:2', 'R3:2']], ['Gate', ['Gate'], ['R1:1', 'R2:1']], ['n1', [], ['R2:2', 'R3:1']],
    ]);
  });

  test('facts of a node, where no element has the name', () => {
    const { netlist, notices } = from('R1 a r1 1', '*@a kind=Earth', '*@r1 pmax=1', '*@nobody pmax=1');
    expect(netlist.nets.map(({ facts }) => facts)).toEqual([{ kind: 'earth' }, {}]);
    expect(netlist.parts[0]?.facts.pmax).toBe(1);
    expect(notices).toEqual([{ line: 5, text: 'The fact line names nobody, which is neither an element nor a node of the deck.' }]);
  });
});

describe('models', () => {
  test('a card of the deck stays with its part; one that nothing uses goes', () => {
    const { netlist } = from('D1 a b DD', '.model DD D(IS=1e-12)', '.model UNUSED D');
    expect(netlist.parts[0]?.model).toBe('DD');
    expect(netlist.models.map(({ name }) => name)).toEqual(['DD']);
  });

  test('the inside of an X that is one part is not listed, that of a box is kept with what it calls', () => {
    const inner = ['.subckt IN a b', 'D1 a b DD', '.ends', '.subckt OUT a b', 'X1 a b IN', '.ends', '.model DD D'];
    expect(from('X1 a b c FET', '*@X1 kind=NMOS', ...power).netlist.subcircuits).toEqual([]);
    const { netlist } = from('X1 a b OUT', ...inner);
    expect([netlist.subcircuits.map(({ name }) => name), netlist.models.map(({ name }) => name)]).toEqual([['IN', 'OUT'], ['DD']]);
  });

  test('a bulk elsewhere than at the source is told', () => {
    expect(from('M1 d g s 0 MM', '.model MM NMOS').notices.map(({ text }) => text)).toEqual(['M1: its bulk is taken as joined to its source.']);
  });
});

test('a kind that does not fit its element is told and kept as words', () => {
  const { netlist, notices } = from('R1 a b 1k', '*@R1 kind=NMOS');
  expect(netlist.parts[0]?.facts.kind).toBe('nmos');
  expect(notices).toEqual([{ line: 2, text: 'R1: kind=NMOS does not fit this element; it is kept as words and no rule uses it.' }]);
});

test('mains is stated in volts rms and hertz; any other sine stays a wave', () => {
  const mains = part('V1 l n SIN(0 325 50)', '*@V1 role=mains');
  expect([mains.facts, mains.wave]).toEqual([{ f: 50, rms: expect.closeTo(229.81, 2), role: 'mains' }, undefined]);
  expect(part('V1 l n SIN(0 325 50)', '*@V1 role=mains rms=230')).toMatchObject({ facts: { rms: 230, f: 50 }, wave: { args: [0, 325, 50] } });
  expect(part('V1 l n SIN(5 325 50)', '*@V1 role=mains')).toMatchObject({ facts: { role: 'mains' }, wave: { args: [5, 325, 50] } });
});

test('values and levels', () => {
  expect(part('R1 a b 10m', '*@R1 kind=lead').facts).toEqual({ rs: 0.01 });
  expect(part('R1 a b 1g', '*@R1 kind=switch').facts).toEqual({ closed_switch: false });
  expect(part('R1 a b 10m', '*@R1 kind=fuse value=2').facts).toEqual({ rs: 0.01, value: 2 });
  expect(part('I1 a b 1m').facts).toEqual({ element: 'I', value: 1e-3 });
  expect(part('R1 a b 12', '*@R1 kind=LAMP').facts).toEqual({ kind: 'lamp', value: 12 });
  expect(part('V1 a 0 5', '*@V1 kind=GPIO').facts).toEqual({ kind: 'controller-pin', value: 5 });
});

test.each<[string, string[]]>([
  ['boxes and own cards', ['X1 x y z FET', 'I1 x 0 SIN(0 1m 50)', 'E1 o 0 x 0 10', 'M2 x y 0 0 MM W=10u L=2u', '.model MM NMOS(LEVEL=1 VTO=2)', ...power, '*@o kind=earth', 'K1 L1 L2 0.9']],
  ['facts of every sort', ['R1 a b 1k', '*@R1 pmax=0.25 kind=lamp part="a b" odd=1 range=1..2 note=x y z', 'V1 a 0 DC 5 PULSE(0 5 0 1n 1n 1u 2u)', '*@V1 role=pin rs=50']],
  ['a missing card', ['D1 a 0 GONE', 'Q1 a b 0 GONE', 'R1 a b 1k']],
])('written and read again: %s', (_, lines) => {
  const { netlist } = from(...lines);
  const again = readDeck(writeDeck(netlist));
  if (!again.ok) throw new Error(JSON.stringify(again.errors));
  expect(contentHash(netlistFromDeck(again.document).netlist)).toBe(contentHash(netlist));
});
