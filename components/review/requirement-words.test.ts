import { describe, expect, it } from 'vitest';
import type { Revision } from '@/lib/schemas/revision';
import { reasonsAgainst, requirementRows, type SignerFacts } from './requirement-words';

const revision: Revision = {
  id: 'r', letter: 'C', circuitId: 'c', seq: 9, contentHash: '7f3a91c40be2d58e', presentationHash: 'p', state: 'in review', note: '', cutBy: { id: 'i', name: 'Ines Okafor' },
  cutAt: '2026-03-12T20:05:00Z', askedAt: '2026-03-12T20:10:00Z', reviewers: [], contributors: [{ id: 'i', name: 'Ines Okafor' }],
  holdPoints: [{ name: 'proof', volts: 15, amps: 0.2 }, { name: 'mains', volts: 325, amps: 2 }], signOffs: [], objections: [],
  requirements: [
    { id: 'open-stop', holdPoint: 'proof', result: 'satisfied', refs: [] },
    { id: 'open-stop', holdPoint: 'mains', result: 'not satisfied', refs: ['R1', 'D1'] },
    { id: 'objection', holdPoint: 'proof', result: 'overridden', refs: ['o'] },
    { id: 'objection', holdPoint: 'mains', result: 'overridden', refs: ['o'] },
  ],
  counts: { stop: 1, caution: 0, advice: 0, undetermined: 0 },
};
const signer: SignerFacts = { contributor: false, signedInAt: '2026-03-13T08:00:00Z', now: new Date('2026-03-13T10:00:00Z') };

describe('requirementRows', () => {
  it('has one result for each hold point', () => {
    for (const row of requirementRows(revision, signer)) expect(row.results.map((result) => result.holdPoint)).toEqual(['proof', 'mains']);
  });

  it('counts only what is not satisfied or in error against signing', () => {
    const rows = requirementRows(revision, signer);
    expect(reasonsAgainst(rows, 'proof')).toEqual([]);
    expect(reasonsAgainst(rows, 'mains').map((reason) => reason.id)).toEqual(['open-stop']);
  });

  it('refuses a contributor at every hold point', () => {
    const rows = requirementRows(revision, { ...signer, contributor: true });
    expect(reasonsAgainst(rows, 'proof').map((reason) => reason.id)).toEqual(['contributor']);
  });

  it('names first, at every hold point, that the revision is not under review', () => {
    for (const state of ['cut', 'superseded', 'withdrawn'] as const) {
      const rows = requirementRows({ ...revision, state }, signer);
      expect(rows[0]).toMatchObject({ id: 'not-in-review', words: 'Under review', worst: 'not satisfied' });
      expect(reasonsAgainst(rows, 'proof').map((reason) => reason.id)).toEqual(['not-in-review']);
    }
    expect(requirementRows(revision, signer)[0]).toMatchObject({ id: 'not-in-review', worst: 'satisfied' });
  });

  it('wants a sign-in of the last 12 hours', () => {
    const rows = requirementRows(revision, { ...signer, now: new Date('2026-03-13T20:00:01Z') });
    expect(reasonsAgainst(rows, 'proof').map((reason) => reason.id)).toEqual(['sign-in-again']);
  });
});
