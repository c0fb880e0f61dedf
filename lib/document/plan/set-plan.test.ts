import { describe, expect, it } from 'vitest';
import { gateStage } from '../testing/gate-stage';
import { dropScenario, putScenario, setPlan } from './set-plan';

const ids = () => {
  let count = 0;
  return () => `new${(count += 1)}`;
};

describe('the power-up plan', () => {
  it('takes scenarios by name and sources by designator, and keeps the ids of points that keep their name', () => {
    const answer = setPlan(gateStage(), [
      { name: '15 V', volts: 15, amps: 0.2, source: 'V1', scenario: 'Bench' },
      { name: 'Bus', volts: 325, amps: 2, source: 'V1', scenario: 'Mains band' },
    ], ids());
    expect(answer.ok && answer.sheet.holdPoints).toEqual([
      { id: 'h1', name: '15 V', volts: 15, amps: 0.2, source: 'V1', scenario: 's1' },
      { id: 'new2', name: 'Bus', volts: 325, amps: 2, source: 'V1', scenario: 'new1' },
    ]);
    expect(answer.ok && answer.sheet.scenarios.at(-1)).toEqual({ id: 'new1', name: 'Mains band', ambient: 25, values: {} });
  });

  it.each([
    ['two of one name', [{ name: 'A', volts: 1, amps: 1 }, { name: ' A ', volts: 2, amps: 1 }], 'called A', 1],
    ['a point below the one before it', [{ name: 'A', volts: 5, amps: 1 }, { name: 'B', volts: 2, amps: 1 }], 'ascend', 1],
    ['a source that is not there', [{ name: 'A', volts: 5, amps: 1, source: 'V9' }], 'no part V9', 0],
    ['a source that is none', [{ name: 'A', volts: 5, amps: 1, source: 'R1' }], 'R1 is not a source', 0],
    ['no volts', [{ name: 'A', volts: 0, amps: 1 }], 'Volts', 0],
    ['no amps', [{ name: 'A', volts: 1, amps: 0 }], 'current limit', 0],
    ['no name', [{ name: '  ', volts: 1, amps: 1 }], 'needs a name', 0],
    ['a scenario without a name', [{ name: 'A', volts: 1, amps: 1, scenario: '' }], 'scenario needs', 0],
  ])('refuses %s, with reason and row', (_, points, words, index) => {
    const answer = setPlan(gateStage(), points, ids());
    expect(answer).toMatchObject({ ok: false, index });
    expect(!answer.ok && answer.reason).toContain(words);
  });
});

describe('scenarios', () => {
  it('are added, changed and refused when the name is taken', () => {
    const stage = gateStage();
    const added = putScenario(stage, { id: 's2', name: 'Warm', ambient: 40, values: { V1: { volts: 16 } } });
    expect(added.ok && added.sheet.scenarios.map((one) => one.name)).toEqual(['Bench', 'Warm']);
    expect(putScenario(stage, { id: 's2', name: 'Bench', ambient: 40, values: {} })).toMatchObject({ ok: false });
    expect(putScenario(stage, { id: 's1', name: 'Bench', ambient: 400, values: {} })).toMatchObject({ ok: false });
  });

  it('leave the hold points that used them when they go', () => {
    const after = dropScenario(gateStage(), 's1');
    expect(after.scenarios).toEqual([]);
    expect(after.holdPoints[0]).toEqual({ id: 'h1', name: '15 V', volts: 15, amps: 0.2, source: 'V1' });
  });
});
