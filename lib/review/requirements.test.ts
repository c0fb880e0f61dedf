import { describe, expect, it } from 'vitest';
import { firstUnmet, requirementsOf, undeterminedAt, type ReviewFacts, type StoredOutcome } from './requirements';

const outcome = (more: Partial<StoredOutcome>): StoredOutcome =>
  ({ fingerprint: 'f', rule: 'r', outcome: 'fail', severity: 'stop', refs: ['R1'], fromVolts: 36, ...more });
const facts = (more: Partial<ReviewFacts> = {}): ReviewFacts => ({
  holdPoints: [{ name: '15 V', volts: 15, sourceKnown: true }, { name: '36 V', volts: 36, sourceKnown: true }, { name: '85 V', volts: 85, sourceKnown: true }],
  outcomes: [], newerAsked: null, objections: [], overridden: [], mustAnswer: [], ...more,
});
const unmetAt = (name: string, more: Partial<ReviewFacts>) => firstUnmet(requirementsOf(facts(more)), name)?.id;

describe('requirements', () => {
  it('are met by a clean revision, at every hold point', () => {
    expect(['15 V', '36 V', '85 V'].map((name) => unmetAt(name, { hashMatches: true }))).toEqual([undefined, undefined, undefined]);
  });

  it('let a stop block its hold point and those above, none below', () => {
    const outcomes = [outcome({})];
    expect(['15 V', '36 V', '85 V'].map((name) => unmetAt(name, { outcomes }))).toEqual([undefined, 'open-stop', 'open-stop']);
  });

  it('let a stop without a voltage block everything', () => {
    expect(unmetAt('15 V', { outcomes: [outcome({ fromVolts: null })] })).toBe('open-stop');
  });

  it('do not count cautions, passes or undetermined outcomes', () => {
    const outcomes = [outcome({ severity: 'caution', fromVolts: null }), outcome({ outcome: 'pass', fromVolts: null }), outcome({ outcome: 'undetermined', fromVolts: null })];
    expect(unmetAt('85 V', { outcomes })).toBeUndefined();
    expect(undeterminedAt(outcomes, 15)).toHaveLength(1);
  });

  it('name the first of several in the fixed order', () => {
    const all: Partial<ReviewFacts> = {
      newerAsked: 'C', hashMatches: false, outcomes: [outcome({ fromVolts: null }), outcome({ outcome: 'error' })], objections: ['o'], mustAnswer: ['t'],
    };
    expect(unmetAt('15 V', all)).toBe('newer-revision');
    expect(unmetAt('15 V', { ...all, newerAsked: null })).toBe('stale-hash');
    expect(unmetAt('15 V', { ...all, newerAsked: null, hashMatches: true })).toBe('open-stop');
    expect(unmetAt('15 V', { ...all, newerAsked: null, hashMatches: true, outcomes: [outcome({ outcome: 'error' })] })).toBe('objection');
    expect(unmetAt('15 V', { outcomes: [outcome({ outcome: 'error' })], mustAnswer: ['t'] })).toBe('must-answer');
    expect(unmetAt('15 V', { outcomes: [outcome({ outcome: 'error' })] })).toBe('rule-error');
  });

  it('show an overridden objection as overridden and a failed check as error', () => {
    const list = requirementsOf(facts({ overridden: ['o1'], outcomes: [outcome({ outcome: 'error', refs: [] , rule: 'gate-floating' })] }));
    expect(list.find(({ id }) => id === 'objection')).toMatchObject({ result: 'overridden', refs: ['o1'] });
    expect(list.find(({ id }) => id === 'rule-error')).toMatchObject({ result: 'error', refs: ['gate-floating'] });
  });

  it('refuse a hold point whose source is not known', () => {
    expect(unmetAt('15 V', { holdPoints: [{ name: '15 V', volts: 15, sourceKnown: false }] })).toBe('which-source');
  });
});
