import { describe, expect, test } from 'vitest';
import { buildNetlist } from './connectivity/build-netlist';
import { pinEnd, type EndKey } from './connectivity/end-key';
import type { DrawnPart, NetlistSource } from './connectivity/netlist-source';
import { canonicalJson, contentHash, hashOf } from './hash';
import { randomSheet } from './testing/random-sheet';
import { SeededRandom } from './testing/seeded-random';

const hash = (source: NetlistSource) => contentHash(buildNetlist(source));

function resistor(id: string, ref: string, value = 1_000): DrawnPart {
  return { id, ref, kind: 'resistor', facts: { value }, origins: {}, leftOpen: [] };
}

const pair: NetlistSource = {
  title: 'Pair', parts: [resistor('a', 'R1'), resistor('b', 'R2')], joins: [[pinEnd('a', '1'), pinEnd('b', '1')]],
  scenarios: [{ name: 'bench', ambient: 25, values: {} }], holdPoints: [{ name: 'first', volts: 15, amps: 0.2 }], models: [], subcircuits: [],
};

test('SHA-256 of the empty object is that of its two characters (FIPS 180-4)', () => {
  expect(hashOf({})).toBe('44136fa355b3678a1146ad16f7e8649e94fb4fc21fe77e8310c060f61caaff8a');
});

test('canonical JSON ignores the order of keys and members that are undefined', () => {
  expect(canonicalJson({ b: [1, { d: undefined, c: 'x' }], a: null })).toBe('{"a":null,"b":[1,{"c":"x"}]}');
});

describe('what changes nothing', () => {
  test.each(Array.from({ length: 30 }, (_, seed) => seed))('order of parts and wires, seed %i: same bytes, same hash', (seed) => {
    const random = new SeededRandom(seed);
    const sheet = randomSheet(25, random);
    const shuffled = {
      ...sheet, parts: random.shuffle(sheet.parts),
      joins: random.shuffle(sheet.joins).map(([a, b]): [EndKey, EndKey] => (random.chance(0.5) ? [a, b] : [b, a])),
    };
    expect(JSON.stringify(buildNetlist(shuffled))).toBe(JSON.stringify(buildNetlist(sheet)));
    expect(hash(shuffled)).toBe(hash(sheet));
  });

  const named: DrawnPart = { id: 'n', ref: '', kind: 'net-name', facts: { name: 'GATE' }, origins: {}, leftOpen: [] };
  const point: DrawnPart = { id: 't', ref: 'TP1', kind: 'test-point', facts: {}, origins: {}, leftOpen: [] };
  test.each<[string, NetlistSource]>([
    ['title', { ...pair, title: 'Other' }],
    ['ids', { ...pair, parts: [resistor('c', 'R1'), resistor('b', 'R2')], joins: [[pinEnd('c', '1'), pinEnd('b', '1')]] }],
    ['a note on a part', { ...pair, parts: [{ ...resistor('a', 'R1'), facts: { value: 1_000, note: 'hot' } }, resistor('b', 'R2')] }],
    ['a net name', { ...pair, parts: [...pair.parts, named], joins: [...pair.joins, [pinEnd('a', '1'), pinEnd('n', '1')]] }],
    ['a test point', { ...pair, parts: [...pair.parts, point], joins: [...pair.joins, [pinEnd('a', '1'), pinEnd('t', '1')]] }],
    ['a mark left open', { ...pair, parts: [{ ...resistor('a', 'R1'), leftOpen: ['2'] }, resistor('b', 'R2')] }],
    ['where a value came from', { ...pair, parts: [{ ...resistor('a', 'R1'), origins: { value: 'assumed' } }, resistor('b', 'R2')] }],
  ])('%s', (_, source) => {
    expect(hash(source)).toBe(hash(pair));
  });

  test('ids of parts whose designator is doubled', () => {
    const twice = (first: string, second: string): NetlistSource => ({
      ...pair, parts: [resistor(first, 'R1'), resistor(second, 'R1'), resistor('c', 'R3'), resistor('d', 'R4')],
      joins: [[pinEnd(first, '1'), pinEnd('c', '1')], [pinEnd(second, '1'), pinEnd('d', '1')]],
    });
    expect(hash(twice('a', 'b'))).toBe(hash(twice('b', 'a')));
  });
});

describe('what changes the circuit changes the hash', () => {
  const zero: DrawnPart = { id: 'z', ref: '', kind: 'zero-volt', facts: {}, origins: {}, leftOpen: [] };
  test.each<[string, NetlistSource]>([
    ['a value', { ...pair, parts: [resistor('a', 'R1', 1_001), resistor('b', 'R2')] }],
    ['a rating', { ...pair, parts: [{ ...resistor('a', 'R1'), facts: { value: 1_000, pmax: 0.25 } }, resistor('b', 'R2')] }],
    ['a designator', { ...pair, parts: [resistor('a', 'R3'), resistor('b', 'R2')] }],
    ['a kind', { ...pair, parts: [{ ...resistor('a', 'R1'), kind: 'capacitor' }, resistor('b', 'R2')] }],
    ['one wire less', { ...pair, joins: [] }],
    ['a wire to another pin', { ...pair, joins: [[pinEnd('a', '1'), pinEnd('b', '2')]] }],
    ['0 V', { ...pair, parts: [...pair.parts, zero], joins: [...pair.joins, [pinEnd('a', '1'), pinEnd('z', '1')]] }],
    ['earth', { ...pair, parts: [...pair.parts, { ...zero, kind: 'earth' }], joins: [...pair.joins, [pinEnd('a', '1'), pinEnd('z', '1')]] }],
    ['a wave', { ...pair, parts: [{ ...resistor('a', 'R1'), wave: { shape: 'sin', args: [0, 1, 50] } }, resistor('b', 'R2')] }],
    ['a model', { ...pair, models: [{ name: 'X', type: 'd', params: { is: 1 }, flags: [] }] }],
    ['the plan', { ...pair, holdPoints: [{ name: 'first', volts: 16, amps: 0.2 }] }],
    ['a scenario', { ...pair, scenarios: [{ name: 'bench', ambient: 40, values: {} }] }],
  ])('%s', (_, source) => {
    expect(hash(source)).not.toBe(hash(pair));
  });

  test.each(Array.from({ length: 30 }, (_, seed) => seed))('a pin pulled off its net, seed %i', (seed) => {
    const random = new SeededRandom(seed + 1_000);
    const sheet = randomSheet(20, random);
    const netlist = buildNetlist(sheet);
    const shared = netlist.nets.find((net) => net.pins.length > 1 && net.pins.some((pin) => !pin.startsWith('TP')));
    const victim = netlist.parts.find((part) => part.kind !== 'test-point' && Object.values(part.pins).includes(shared?.name ?? ''));
    if (!shared || !victim) throw new Error('The seed draws no shared net');
    const pin = Object.keys(victim.pins).find((name) => victim.pins[name] === shared.name) as string;
    const alone = { ...netlist, parts: netlist.parts.map((part) => (part === victim ? { ...part, pins: { ...part.pins, [pin]: 'alone' } } : part)) };
    const others = netlist.parts.filter((part) => part.kind !== 'test-point').flatMap((part) => Object.values(part.pins)).filter((net) => net === shared.name);
    if (others.length === 1 && shared.name !== '0') expect(contentHash(alone)).toBe(contentHash(netlist));
    else expect(contentHash(alone)).not.toBe(contentHash(netlist));
  });
});
