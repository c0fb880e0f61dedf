import { describe, expect, test } from 'vitest';
import { factRegistry, isFactKey } from '../facts/fact-registry';
import { units } from '../quantity/unit';
import { families } from './kind';
import { kindIds } from './kind-id';
import { kindOf, kindRegistry, kindsByFamily } from './kind-registry';
import type { SymbolArt } from './symbol-art';

const all = kindIds.map(kindOf);

/** End points of an absolute path's pen moves, enough to see that a pin's line starts at the pin. */
function starts(art: SymbolArt): string[] {
  return art.shapes.flatMap((shape) => (shape.shape === 'path' ? [...shape.d.matchAll(/(-?[0-9.]+) (-?[0-9.]+)|([HV])(-?[0-9.]+)/g)] : [])
    .map(([, x, y, axis, length]) => (axis === undefined ? `${x} ${y}` : `${axis}${length}`)));
}

test('every id has its kind and every kind its id', () => {
  expect(Object.keys(kindRegistry).sort()).toEqual([...kindIds].sort());
  expect(all.map(({ id }) => id)).toEqual([...kindIds]);
});

test('the drawer shows each kind but the box once, families in the order of the job', () => {
  expect(kindsByFamily.map(({ family }) => family)).toEqual([...families]);
  expect(kindsByFamily.flatMap(({ kinds }) => kinds.map(({ id }) => id)).sort()).toEqual(kindIds.filter((id) => id !== 'box').sort());
});

describe.each(all.map((kind) => [kind.id, kind] as const))('%s', (_, kind) => {
  test('pins have different names and stand on the grid', () => {
    expect(new Set(kind.pins.map(({ name }) => name)).size).toBe(kind.pins.length);
    for (const { x, y } of kind.pins) expect([Math.abs(x % 10), Math.abs(y % 10)]).toEqual([0, 0]);
  });

  test('a line of each drawing ends at each pin', () => {
    for (const art of [kind.symbol, ...(kind.alternatives ?? [])]) {
      const ends = starts(art);
      for (const { x, y } of kind.pins) expect([`${x} ${y}`, `H${x}`, `V${y}`].some((end) => ends.includes(end))).toBe(true);
    }
  });

  test('fields name facts once, with units that exist', () => {
    const facts = kind.fields.map(({ fact }) => fact);
    expect(new Set(facts).size).toBe(facts.length);
    for (const field of kind.fields) expect(units[field.unit ?? factRegistry[field.fact].unit]).toBeDefined();
    if (facts.includes('value')) expect(kind.fields.find(({ fact }) => fact === 'value')?.unit).toBeTruthy();
  });

  test('defaults and printed facts are fields', () => {
    const facts = kind.fields.map(({ fact }) => fact);
    for (const key of [...Object.keys(kind.defaults), ...kind.printed]) expect(isFactKey(key) && facts.includes(key)).toBe(true);
  });

  test('an element that a deck has carries every pin', () => {
    if (kind.deck.pinOrder.length === 0) return;
    for (const { name } of kind.pins) expect(kind.deck.pinOrder).toContain(name);
  });
});
