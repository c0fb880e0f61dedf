import { describe, expect, it } from 'vitest';
import { layOutColumn, ruleOffset } from './column-layout';

const entry = (key: string, y: number | null, height = 50) => ({ key, y, height });

describe('layOutColumn', () => {
  it('stands an entry with its rule level with its target', () => {
    expect(layOutColumn([entry('a', 200)], 600).tops.get('a')).toBe(200 - ruleOffset);
  });

  it('keeps the height order when entries push each other down', () => {
    const { tops } = layOutColumn([entry('low', 120), entry('high', 100), entry('mid', 110)], 600);
    const order = [...tops].sort((a, b) => a[1] - b[1]).map(([key]) => key);
    expect(order).toEqual(['high', 'mid', 'low']);
    const sorted = [...tops.values()].sort((a, b) => a - b);
    expect((sorted[1] ?? 0) - (sorted[0] ?? 0)).toBeGreaterThanOrEqual(50);
  });

  it('moves the last ones up rather than out of the room', () => {
    const { tops } = layOutColumn([entry('a', 560), entry('b', 590)], 600);
    expect((tops.get('b') ?? 0) + 50).toBeLessThanOrEqual(600);
    expect((tops.get('a') ?? 0) + 50).toBeLessThanOrEqual(tops.get('b') ?? 0);
  });

  it('never overlaps, whatever the room', () => {
    const many = Array.from({ length: 40 }, (_, index) => entry(`e${index}`, (index * 37) % 300, 30 + (index % 5) * 20));
    const { tops } = layOutColumn(many, 400);
    const spans = many.map(({ key, height }) => ({ top: tops.get(key) ?? 0, height })).sort((a, b) => a.top - b.top);
    for (let index = 1; index < spans.length; index += 1) {
      const before = spans[index - 1];
      const now = spans[index];
      if (before && now) expect(now.top).toBeGreaterThanOrEqual(before.top + before.height);
    }
    expect(spans[0]?.top).toBeGreaterThanOrEqual(0);
  });

  it('puts entries without a place last', () => {
    const { tops } = layOutColumn([entry('lost', null), entry('a', 300)], 600);
    expect(tops.get('lost')).toBeGreaterThan(tops.get('a') ?? Infinity);
  });
});
