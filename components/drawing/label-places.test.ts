import { describe, expect, it } from 'vitest';
import { boxesOverlap } from '@/lib/document/geometry/point';
import type { PartRecord, Sheet } from '@/lib/document/records';
import { placeLabels } from './label-places';

const part = (id: string, ref: string, x: number, y: number, turn: PartRecord['turn'] = 0): PartRecord => ({
  id, ref, kind: 'resistor', x, y, turn, mirror: false, facts: { value: 4_700, pmax: 0.25 }, origins: {}, leftOpen: [],
});
const sheet = (parts: readonly PartRecord[]): Sheet => ({ title: '', parts, wires: [], junctions: [], scenarios: [], holdPoints: [], models: [], subcircuits: [] });

describe('placeLabels', () => {
  it('stands above a level part and beside an upright one', () => {
    const [level, upright] = placeLabels(sheet([part('a', 'R1', 0, 0), part('b', 'R2', 400, 0, 90)]));
    expect(level?.box.bottom).toBeLessThan(0);
    expect(upright?.box.left).toBeGreaterThan(400);
  });

  it('prints the designator and what the kind prints', () => {
    const [label] = placeLabels(sheet([part('a', 'R1', 0, 0)]));
    expect(label?.ref).toBe('R1');
    expect(label?.values[0]).toBe('4.7\u2009kΩ');
  });

  it('never lets the words of neighbours overlap', () => {
    const crowd = Array.from({ length: 12 }, (_, index) => part(`p${index}`, `R${index + 1}`, (index % 4) * 80, Math.floor(index / 4) * 60));
    const labels = placeLabels(sheet(crowd));
    for (const a of labels) for (const b of labels) if (a !== b) expect(boxesOverlap(a.box, b.box)).toBe(false);
  });
});
