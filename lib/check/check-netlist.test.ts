import { afterAll, expect, test, vi } from 'vitest';
import type { Finding } from '@/lib/netlist/findings/finding';
import type { Netlist } from '@/lib/netlist/netlist';
import { createNodeEngine } from '@/lib/spice/node-engine';
import { PointCache } from './caching-engine';
import { checkNetlist, type CheckOptions } from './check-netlist';
import { netlistOfLines } from './testing/case-netlist';

// The engine takes seconds to start on a busy machine.
vi.setConfig({ testTimeout: 60_000 });

const engine = createNodeEngine();
afterAll(() => engine.dispose());

const indicator = (role: string): Netlist => netlistOfLines(`V1 vbus 0 15${role === '' ? '' : `\n*@V1 role=${role}`}
R1 vbus a 1.2k
*@R1 pmax=0.25
D1 a 0 DL
*@D1 kind=LED vf=1.9 if_max=25m`);
const plan = [{ name: 'proof', volts: 15, amps: 1 }, { name: 'mid', volts: 36, amps: 1 }, { name: 'bus', volts: 325, amps: 2 }];
const heat = async (netlist: Netlist, options: Partial<CheckOptions> = {}): Promise<Finding | undefined> =>
  (await checkNetlist(netlist, { engine, ...options })).findings.find(({ rule }) => rule === 'resistor-dissipation');

test('a plan that cannot tell its source leaves the numbers undetermined and asks which', async () => {
  for (const role of ['', 'battery']) {
    expect(await heat({ ...indicator(role), holdPoints: plan })).toMatchObject({ outcome: 'undetermined', message: expect.stringContaining('which source') as string });
  }
  expect(await heat({ ...indicator(''), holdPoints: plan.map((point) => ({ ...point, source: 'V1' })) }, { holdPoint: 'bus' })).toMatchObject({ outcome: 'fail', fromVolts: 325 });
});

test('one hold point alone is judged by itself: no lower one passes there', async () => {
  const { findings } = await checkNetlist({ ...indicator('supply'), holdPoints: plan }, { engine, holdPoint: 'mid' });
  expect(findings.filter(({ outcome }) => outcome === 'fail').map(({ rule, holdPoint }) => [rule, holdPoint])).toContainEqual(['resistor-dissipation', 'mid']);
  expect(findings.some(({ rule }) => rule === 'indicator-at-stage')).toBe(false);
});

test('a scenario’s values are set first, then the hold point’s', async () => {
  const scenarios = [{ name: 'bench', ambient: 40, values: { V1: { volts: 300 } } }];
  const netlist: Netlist = { ...indicator('supply'), scenarios };
  expect(await heat(netlist, { scenario: 'bench' })).toMatchObject({ outcome: 'fail', severity: 'stop', scenario: 'bench', holdPoint: null });
  expect(await heat({ ...netlist, holdPoints: [{ name: 'proof', scenario: 'bench', volts: 12, amps: 1 }] })).toMatchObject({ outcome: 'pass', scenario: 'bench' });
});

test('a supply’s current limit never turns a fail into a pass', async () => {
  const limited = [{ name: 'bus', volts: 325, amps: 0.005 }];
  const finding = await heat({ ...indicator('supply'), holdPoints: limited });
  expect(finding).toMatchObject({ outcome: 'fail', severity: 'stop', message: expect.stringContaining('supply limit left out') as string });
});

test('points that an edit leaves alone are not run again', async () => {
  let runs = 0;
  const counting = { simulate: (request: Parameters<typeof engine.simulate>[0]) => { runs += 1; return engine.simulate(request); } };
  const cache = new PointCache();
  await checkNetlist(indicator('supply'), { engine: counting, cache });
  const first = runs;
  expect(first).toBe(2);
  await checkNetlist({ ...indicator('supply'), title: 'renamed' }, { engine: counting, cache });
  expect(runs).toBe(first);
});
