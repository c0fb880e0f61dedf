import { describe, expect, it } from 'vitest';
import { draw } from '@/db/seed/draw';
import { inductionHeaterDriver } from '@/db/seed/induction-heater-driver';
import { pinPlaceOf } from '@/lib/document/geometry/pin-place';
import { leaderEnds } from './leader-ends';

let next = 0;
const sheet = draw(inductionHeaterDriver, () => `demo-${(next += 1)}`);
const gate = sheet.parts.flatMap((part) => (part.ref === 'Q1' ? [pinPlaceOf(part, 'G')] : []))[0];

describe('leaderEnds', () => {
  it('shows a finding on a net at the transistor, not at the part to change first', () => {
    const found = leaderEnds(sheet, { kind: 'ref', ref: 'J1', on: { net: 'GATE', refs: ['J1', 'Q1', 'R2'] } });
    expect(found?.words).toBe('Q1:G');
    for (const end of found?.ends ?? []) expect(Math.abs(end.x - (gate?.x ?? NaN)) + Math.abs(end.y - (gate?.y ?? NaN))).toBeLessThanOrEqual(40);
  });

  it('falls back to the part where no transistor is on the net', () => {
    expect(leaderEnds(sheet, { kind: 'ref', ref: 'R4', on: { net: 'DC LINK', refs: ['R4'] } })?.words).toBe('R4');
  });

  it('has no end for what is gone', () => {
    expect(leaderEnds(sheet, { kind: 'ref', ref: 'R99' })).toBeNull();
  });
});
