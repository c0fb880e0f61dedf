import { expect, test } from 'vitest';
import type { Station } from '../points/station';
import { collect } from './collect';
import { settle } from './precedence';
import type { Outcome } from './rule';

const station = (holdPoint: string | null, volts: number): Station => ({ holdPoint, scenario: null, volts, ambient: 25, power: null, settings: {} });
const plan = [station('proof', 15), station('mid', 36), station('bus', 325)];
const outcome = (given: Partial<Outcome>): Outcome => ({
  outcome: 'fail', severity: 'stop', confidence: 'proven', target: { part: ['r1'] }, refs: ['R1'], nets: [], holdPoint: null, scenario: null,
  state: 'as drawn', corner: 'typ', message: '', evidence: [], ...given,
});
const rule = { id: 'some-rule', version: 1 };

test('one finding for a fingerprint: the worst, at the lowest hold point that has it', () => {
  const [one, ...more] = collect(rule, [
    outcome({ holdPoint: 'proof', outcome: 'pass' }), outcome({ holdPoint: 'mid', severity: 'caution', message: 'warm' }), outcome({ holdPoint: 'bus', message: 'burns' }),
  ], plan);
  expect(more).toEqual([]);
  expect(one?.finding).toMatchObject({ outcome: 'fail', severity: 'stop', holdPoint: 'bus', fromVolts: 325, message: 'burns' });
  expect(one?.finding.evidence).toContainEqual(expect.objectContaining({ quantity: 'milder from', value: 36, source: 'caution at mid' }));
});

test('what does not depend on the plan stands at its first hold point, and without a plan at none', () => {
  expect(collect(rule, [outcome({})], plan)[0]?.finding).toMatchObject({ holdPoint: 'proof', fromVolts: 15 });
  expect(collect(rule, [outcome({})], [station(null, 12)])[0]?.finding).toMatchObject({ holdPoint: null, fromVolts: null });
});

test('a fail somewhere outweighs what is undetermined elsewhere, and that outweighs a pass', () => {
  const all = [outcome({ holdPoint: 'proof', outcome: 'undetermined' }), outcome({ holdPoint: 'mid', severity: 'advice' }), outcome({ holdPoint: 'bus', outcome: 'pass' })];
  expect(collect(rule, all, plan)[0]?.finding.outcome).toBe('fail');
  expect(collect(rule, [all[0]!, all[2]!], plan)[0]?.finding.outcome).toBe('undetermined');
});

test('fingerprints follow ids and roles, not their order, and the rule’s version', () => {
  const print = (version: number, target: Outcome['target']) => collect({ id: 'some-rule', version }, [outcome({ target })], plan)[0]?.finding.fingerprint;
  expect(print(1, { led: ['a', 'b'], resistor: ['c'] })).toBe(print(1, { resistor: ['c'], led: ['b', 'a'] }));
  expect(print(1, { led: ['a'] })).not.toBe(print(2, { led: ['a'] }));
  expect(print(1, { led: ['a'] })).not.toBe(print(1, { resistor: ['a'] }));
});

test('an indicator’s one stop stands instead of those of its parts', () => {
  const stage = collect({ id: 'indicator-at-stage', version: 1 }, [outcome({ target: { part: ['r1', 'd1'] } })], plan);
  const own = collect({ id: 'resistor-dissipation', version: 1 }, [outcome({ target: { resistor: ['r1'] } }), outcome({ target: { resistor: ['r9'] } })], plan);
  expect(settle([...stage, ...own]).map(({ finding }) => finding.rule)).toEqual(['indicator-at-stage', 'resistor-dissipation']);
});

test('a lifted lead stands instead of a floating gate that is driven as drawn, never instead of a stop', () => {
  const lifted = collect({ id: 'lifted-lead', version: 1 }, [outcome({ target: { transistor: ['q1'] } })], plan);
  const floating = (severity: Outcome['severity']) => collect({ id: 'gate-floating', version: 1 }, [outcome({ severity, target: { transistor: ['q1'] } })], plan);
  expect(settle([...lifted, ...floating('caution')])).toHaveLength(1);
  expect(settle([...lifted, ...floating('stop')])).toHaveLength(2);
});
