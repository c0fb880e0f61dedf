import { describe, expect, it } from 'vitest';
import { QuietSheets } from './quiet-sheets';

const sheet = (headSeq: number) => [{ id: 'c', headSeq }];

describe('QuietSheets', () => {
  it('waits until a sheet has been quiet for 2 s', () => {
    const sheets = new QuietSheets();
    expect(sheets.due(sheet(1), 0)).toEqual([]);
    expect(sheets.due(sheet(2), 1_500)).toEqual([]);
    expect(sheets.due(sheet(2), 3_499)).toEqual([]);
    expect(sheets.due(sheet(2), 3_500)).toEqual(['c']);
  });

  it('checks at least every 30 s while a sheet is edited', () => {
    const sheets = new QuietSheets();
    let checkedAt = -1;
    for (let now = 0, seq = 1; checkedAt < 0 && now <= 60_000; now += 1_000, seq += 1) {
      if (sheets.due(sheet(seq), now).length > 0) checkedAt = now;
    }
    expect(checkedAt).toBe(30_000);
    sheets.checked('c');
    expect(sheets.due(sheet(99), 31_000)).toEqual([]);
  });

  it('forgets a sheet that somebody else has checked', () => {
    const sheets = new QuietSheets();
    sheets.due(sheet(1), 0);
    sheets.due([], 1_000);
    expect(sheets.due(sheet(2), 29_999)).toEqual([]);
    expect(sheets.due(sheet(2), 31_999)).toEqual(['c']);
  });
});
