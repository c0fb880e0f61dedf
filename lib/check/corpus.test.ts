import { readdirSync, readFileSync } from 'node:fs';
import path from 'node:path';
import { afterAll, expect, test, vi } from 'vitest';
import { netlistFromDeck } from '@/lib/netlist/deck/netlist-from-deck';
import { readDeck } from '@/lib/netlist/deck/read-deck';
import type { Netlist } from '@/lib/netlist/netlist';
import { createNodeEngine } from '@/lib/spice/node-engine';
import { checkNetlist } from './check-netlist';

// The engine takes seconds to start on a busy machine.
vi.setConfig({ testTimeout: 60_000 });

const folder = path.join(process.cwd(), 'lib/check/corpus');
const engine = createNodeEngine();
afterAll(() => engine.dispose());

function netlistOf(file: string): Netlist {
  const reading = readDeck(readFileSync(path.join(folder, file), 'utf8'));
  if (!reading.ok) throw new Error(JSON.stringify(reading.errors));
  return netlistFromDeck(reading.document).netlist;
}

async function failures(netlist: Netlist): Promise<readonly string[]> {
  const { findings } = await checkNetlist(netlist, { engine });
  return findings.filter(({ outcome }) => outcome === 'fail' || outcome === 'error')
    .map(({ severity, rule, refs, holdPoint }) => [severity, rule, refs.join(' '), ...(holdPoint === null ? [] : [holdPoint])].join(', '));
}

const faulty: Readonly<Record<string, readonly string[]>> = {
  'induction-driver.cir': [
    'stop, lifted-lead, J1 Q1 R2', 'stop, led-resistor-undersized, R1 D1', 'stop, resistor-dissipation, R1',
    'stop, resistor-voltage-rating, R1', 'caution, margin-at-mains, Q1',
  ],
};
const right = readdirSync(folder).filter((file) => !(file in faulty));

test.each(right)('%s is right: no stop, no caution', async (file) => {
  expect((await failures(netlistOf(file))).filter((line) => !line.startsWith('advice'))).toEqual([]);
});

test.each(Object.entries(faulty))('%s keeps its findings', async (file, expected) => {
  expect(await failures(netlistOf(file))).toEqual(expected);
});

test('the driver on its plan: one stop at every hold point, one from the second on, a margin at the last', async () => {
  const volts: readonly (readonly [number, number])[] = [[15, 0.2], [36, 0.5], [85, 0.5], [160, 1], [325, 2]];
  const holdPoints = volts.map(([at, amps]) => ({ name: `${at} V`, volts: at, amps }));
  expect(await failures({ ...netlistOf('induction-driver.cir'), holdPoints })).toEqual([
    'stop, lifted-lead, J1 Q1 R2, 15 V', 'stop, indicator-at-stage, R1 D1, 36 V', 'caution, margin-at-mains, Q1, 325 V',
  ]);
});
