import { describe, expect, it } from 'vitest';
import { patience, saveMark, type SaveFacts } from './save-mark';

const facts: SaveFacts = { waiting: 0, savedAt: null, owedSince: 1_000, offline: undefined, room: 'saving', roomWhy: '' };
const mark = (change: Partial<SaveFacts>, now = 1_500) => saveMark({ ...facts, ...change }, now);

describe('the save mark', () => {
  it('says saved only when nothing waits for its acknowledgement', () => {
    expect(mark({})).toEqual({ state: 'saved', at: null });
    expect(mark({ savedAt: 1_200 })).toEqual({ state: 'saved', at: 1_200 });
    expect(mark({ waiting: 1, savedAt: 1_200 }).state).not.toBe('saved');
  });

  it('says saving only while the server can and does answer', () => {
    expect(mark({ waiting: 2 })).toEqual({ state: 'saving', edits: 2 });
    expect(mark({ waiting: 2 }, 1_000 + patience)).toEqual({ state: 'saving', edits: 2 });
    expect(mark({ waiting: 2 }, 1_001 + patience)).toMatchObject({ state: 'not saved', edits: 2 });
  });

  it('gives the reason when it cannot be saved now', () => {
    expect(mark({ waiting: 1, offline: 'No connection.' })).toEqual({ state: 'not saved', edits: 1, why: 'No connection.' });
    for (const room of ['not saving', 'draining', 'quarantined'] as const) {
      expect(mark({ waiting: 1, room, roomWhy: 'Why.' })).toEqual({ state: 'not saved', edits: 1, why: 'Why.' });
    }
  });
});
