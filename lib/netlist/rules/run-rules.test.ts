import { expect, test } from 'vitest';
import { buildCircuit } from '../circuit/circuit';
import type { Netlist } from '../netlist';
import type { Rule } from './rule';
import { runRules } from './run-rules';

const empty: Netlist = { format: 1, title: '', parts: [], nets: [], models: [], subcircuits: [], scenarios: [], holdPoints: [] };
const broken: Rule = {
  id: 'broken', version: 1, title: '', severity: 'stop', needs: 'topology', parameters: {},
  check: () => { throw new Error('division by a missing resistor'); },
};

test('a rule that breaks down is an error, not a pass and not a crash', () => {
  expect(runRules([broken], buildCircuit(empty))).toMatchObject([{ rule: 'broken', outcome: 'error', message: expect.stringContaining('division by a missing resistor') as string }]);
});

test('each rule’s time is told apart', () => {
  let clock = 0;
  const times: [string, number][] = [];
  runRules([{ ...broken, check: () => [] }], buildCircuit(empty), { now: () => (clock += 5), onTime: (rule, ms) => times.push([rule, ms]) });
  expect(times).toEqual([['broken', 5]]);
});

test('a parameter that a bench has changed reaches its rule', () => {
  const seen: unknown[] = [];
  const rule: Rule = { ...broken, id: 'asks', parameters: { share: { value: 0.8, unit: '', words: 'w', source: 's' } }, check: ({ parameters }) => { seen.push(parameters); return []; } };
  runRules([rule], buildCircuit(empty), { parameters: { asks: { share: 0.7 } } });
  expect(seen).toEqual([{ share: 0.7 }]);
});
