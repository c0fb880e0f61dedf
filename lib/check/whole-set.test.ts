import { readFileSync } from 'node:fs';
import path from 'node:path';
import { afterAll, describe, expect, test, vi } from 'vitest';
import { buildNetlist } from '@/lib/netlist/connectivity/build-netlist';
import { netlistFromDeck } from '@/lib/netlist/deck/netlist-from-deck';
import { readDeck } from '@/lib/netlist/deck/read-deck';
import type { Finding } from '@/lib/netlist/findings/finding';
import type { Netlist, NetlistPart } from '@/lib/netlist/netlist';
import { randomSheet } from '@/lib/netlist/testing/random-sheet';
import { SeededRandom } from '@/lib/netlist/testing/seeded-random';
import { createNodeEngine } from '@/lib/spice/node-engine';
import { checkNetlist } from './check-netlist';
import { checkTopology } from './check-topology';

// The engine takes seconds to start on a busy machine.
vi.setConfig({ testTimeout: 60_000 });

const engine = createNodeEngine();
afterAll(() => engine.dispose());

function driver(): Netlist {
  const reading = readDeck(readFileSync(path.join(process.cwd(), 'lib/check/corpus/induction-driver.cir'), 'utf8'));
  if (!reading.ok) throw new Error('the corpus deck cannot be read');
  return { ...netlistFromDeck(reading.document).netlist, holdPoints: [{ name: 'proof', volts: 15, amps: 0.2 }, { name: 'bus', volts: 325, amps: 2 }] };
}

const fails = async (netlist: Netlist): Promise<readonly Finding[]> => (await checkNetlist(netlist, { engine })).findings.filter(({ outcome }) => outcome === 'fail');
const shape = (findings: readonly Finding[]): readonly string[] => findings.map(({ rule, severity, holdPoint, fingerprint }) => `${rule} ${severity} ${holdPoint} ${fingerprint}`).sort();

function renamed(netlist: Netlist, net: (name: string) => string, ref: (name: string) => string): Netlist {
  const part = (one: NetlistPart): NetlistPart => ({ ...one, ref: ref(one.ref), pins: Object.fromEntries(Object.entries(one.pins).map(([pin, name]) => [pin, net(name)])) });
  return {
    ...netlist,
    parts: netlist.parts.map(part),
    nets: netlist.nets.map((one) => ({ ...one, name: net(one.name), givenNames: one.givenNames.map(net), pins: one.pins.map((pin) => pin.replace(/^[^:]+/, ref)) })),
  };
}

describe('the same circuit told another way', () => {
  test('other names of parts and nets change no finding but its words', async () => {
    const netlist = driver();
    const other = renamed(netlist, (name) => (name === '0' ? name : `other_${name}`), (ref) => ref.replace(/(\d+)$/, '9$1'));
    expect(shape(await fails(other))).toEqual(shape(await fails(netlist)));
  });

  test('parts and nets in another order change nothing', async () => {
    const netlist = driver();
    const other: Netlist = { ...netlist, parts: [...netlist.parts].reverse(), nets: [...netlist.nets].reverse() };
    expect(shape(await fails(other))).toEqual(shape(await fails(netlist)));
  });

  test('resistors and coils turned end for end change nothing', async () => {
    const netlist = driver();
    const turned = (part: NetlistPart): NetlistPart => (part.kind === 'resistor' || part.kind === 'air-core-coil' || part.kind === 'removable-lead'
      ? { ...part, pins: { 1: part.pins['2'] ?? '', 2: part.pins['1'] ?? '' } } : part);
    expect(shape(await fails({ ...netlist, parts: netlist.parts.map(turned) }))).toEqual(shape(await fails(netlist)));
  });

  test('a piece of wire in the gate’s way changes nothing', async () => {
    const netlist = driver();
    const wire: NetlistPart = { id: 'wire', ref: 'R99', kind: 'resistor', pins: { 1: 'gate', 2: 'beyond' }, facts: { value: 1e-3, wire: true }, origins: {}, leftOpen: [] };
    const parts = netlist.parts.map((part) => (part.ref === 'Q1' ? { ...part, pins: { ...part.pins, G: 'beyond' } } : part));
    const nets = [...netlist.nets.map((net) => (net.name === 'gate' ? { ...net, pins: ['R3:2', 'R99:1'] } : net)), { name: 'beyond', givenNames: [], pins: ['Q1:G', 'R99:2'], facts: {} }];
    expect(shape(await fails({ ...netlist, parts: [...parts, wire], nets }))).toEqual(shape(await fails(netlist)));
  });
});

describe('random sheets', () => {
  const seeds = Array.from({ length: 60 }, (_, index) => index + 1);
  test.each(seeds)('seed %i never breaks a rule and answers the same twice', (seed) => {
    const netlist = buildNetlist(randomSheet(4 + (seed % 30), new SeededRandom(seed)));
    const findings = checkTopology(netlist);
    expect(findings.filter(({ outcome }) => outcome === 'error').map(({ message }) => message)).toEqual([]);
    expect(findings.length).toBeLessThan(20 * (netlist.parts.length + 1));
    expect(JSON.stringify(checkTopology(netlist))).toBe(JSON.stringify(findings));
    expect(new Set(findings.map(({ fingerprint }) => fingerprint)).size).toBe(findings.length);
  });

  test.each(seeds.slice(0, 15))('seed %i with the engine', async (seed) => {
    const netlist = buildNetlist(randomSheet(4 + (seed % 12), new SeededRandom(1000 + seed)));
    const { findings } = await checkNetlist(netlist, { engine });
    expect(findings.filter(({ outcome }) => outcome === 'error').map(({ message }) => message)).toEqual([]);
    expect(JSON.stringify((await checkNetlist(netlist, { engine })).findings)).toBe(JSON.stringify(findings));
  });
});
