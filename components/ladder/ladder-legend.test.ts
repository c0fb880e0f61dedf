import { describe, expect, it } from 'vitest';
import { legendWidth, placeFeet, placeLegend } from './ladder-legend';

const row = { from: 0, to: 900 };

describe('placeLegend', () => {
  it('keeps words on their preferred side while there is room', () => {
    const { stands: [flag] } = placeLegend([{ id: 'a', x: 300, half: 9, words: 'STOPS 1, 2', prefer: 'right' }], row);
    expect(flag).toMatchObject({ x: 300, side: 'right', words: 'STOPS 1, 2' });
  });

  it('turns words to the other side at the end of the row', () => {
    const { stands: [needle] } = placeLegend([{ id: 'a', x: 880, half: 9, words: 'SHOWN AT 325 V', prefer: 'right' }], row);
    expect(needle?.side).toBe('left');
  });

  it('moves a mark aside when another stands at the same voltage', () => {
    const { stands: [needle, flag] } = placeLegend([
      { id: 'needle', x: 300, half: 9, words: 'SHOWN AT 36 V', prefer: 'right' },
      { id: 'flag', x: 300, half: 9, words: 'STOP 2', prefer: 'right' },
    ], row);
    expect(needle?.x).toBe(300);
    expect(flag?.x).toBeLessThanOrEqual(282);
  });

  it('never lets two texts overlap', () => {
    const { stands: placed } = placeLegend([0, 1, 2, 3, 4, 5].map((index) => ({
      id: String(index), x: 200 + index * 40, half: 9, words: 'STOPS 1, 2, 3', short: '1, 2, 3', prefer: 'right' as const,
    })), row);
    const spans = placed.flatMap((stand) => (stand.words === null ? [] : [stand.side === 'right'
      ? { from: stand.x + 9, to: stand.x + 9 + legendWidth(stand.words) }
      : { from: stand.x - 9 - legendWidth(stand.words), to: stand.x - 9 }]));
    for (const a of spans) for (const b of spans) if (a !== b) expect(a.to <= b.from || a.from >= b.to).toBe(true);
  });
});

it('gives the state its short form rather than let a mark run into it', () => {
  const { state, stands: [mark] } = placeLegend([{ id: 'limit', x: 120, half: 13, words: '60 V LIMIT', prefer: 'right' }], row, ['B SIGNED OFF TO 15 V, SHEET UNCHANGED', 'TO 15 V'], 8);
  expect(state).toBe('TO 15 V');
  expect(mark?.x).toBe(120);
});

describe('placeFeet', () => {
  it('drops the amps of all when one pair would meet', () => {
    expect(placeFeet([{ x: 0, full: '12 V / 0.1 A', short: '12 V' }, { x: 60, full: '30 V / 0.5 A', short: '30 V' }], 0)).toEqual(['short', 'short']);
  });

  it('keeps the chosen one when there is room for one only', () => {
    expect(placeFeet([{ x: 0, full: '48 V / 1 A', short: '48 V' }, { x: 12, full: '55 V / 1 A', short: '55 V' }], 1)).toEqual(['none', 'short']);
  });
});
