import { describe, expect, it } from 'vitest';
import type { Revision, SignOff } from '@/lib/schemas/revision';
import { signedState } from './signed-state';

const now = new Date('2026-03-20T12:00:00Z');
const plan = [{ name: 'first', volts: 15, amps: 0.2 }, { name: 'second', volts: 36, amps: 0.5 }];
const signOff = (holdPoint: string, more: Partial<SignOff> = {}): SignOff => ({
  id: holdPoint, holdPoint, by: { id: 'm', name: 'Ruth Adeyemi' }, at: '2026-03-12T20:00:00Z', until: '2026-06-01T00:00:00Z', conditions: null, ...more,
});
const revision = (letter: string, signOffs: readonly SignOff[]): Revision => ({
  id: letter, letter, circuitId: 'c', seq: 1, contentHash: 'h', presentationHash: 'p', state: 'in review', note: '', cutBy: { id: 'i', name: 'Ines Okafor' },
  cutAt: '2026-03-11T10:00:00Z', askedAt: null, reviewers: [], contributors: [], holdPoints: plan, signOffs: [...signOffs], objections: [], requirements: [],
  counts: { stop: 0, caution: 0, advice: 0, undetermined: 0 },
});

describe('signedState', () => {
  it('shows the highest standing sign-off of the revision on show', () => {
    expect(signedState([revision('B', [signOff('first'), signOff('second')])], 'B', false, now)).toMatchObject({ to: 36, past: null });
  });

  it('never lets a sign-off cover the edited sheet', () => {
    expect(signedState([revision('B', [signOff('first')])], null, true, now)).toMatchObject({ to: null, past: { letter: 'B', to: 15 } });
  });

  it('shows an earlier sign-off as past on a newer revision', () => {
    expect(signedState([revision('C', []), revision('B', [signOff('first')])], 'C', false, now)).toMatchObject({ to: null, past: { letter: 'B', to: 15 } });
  });

  it('does not show a later sign-off on an older revision', () => {
    expect(signedState([revision('C', [signOff('first')]), revision('B', [])], 'B', false, now)).toMatchObject({ to: null, past: null });
  });

  it.each([{ withdrawnAt: '2026-03-15T00:00:00Z' }, { until: '2026-03-19T00:00:00Z' }])('calls one that was withdrawn or is past its date void', (more) => {
    expect(signedState([revision('B', [signOff('first', more)])], 'B', false, now)).toMatchObject({ to: null, struck: 15 });
  });
});
