import { describe, expect, it } from 'vitest';
import { TestEditor } from './testing/test-editor';

const rows = (count: number) => Array.from({ length: count }, (_, at) => ({
  id: `p${String(at).padStart(5, '0')}`, ref: `R${at + 1}`, kind: 'resistor' as const, x: (at % 40) * 100, y: Math.floor(at / 40) * 100, turn: 0 as const, mirror: false,
  facts: {}, origins: {}, leftOpen: [],
}));

describe('pasting more than a sheet takes', () => {
  it('is refused with both numbers, and changes nothing', () => {
    const test = new TestEditor().place('resistor', 0, 0);
    const before = test.hashes;
    test.run('paste', { clip: { holdoff: 'clip', parts: rows(1_000), wires: [], junctions: [] } });
    expect(test.editor.state.message).toContain('would have 1001 parts; it takes 1000');
    expect(test.hashes).toEqual(before);
  });

  it('takes what fits', () => {
    const test = new TestEditor().place('resistor', 0, 0).run('paste', { clip: { holdoff: 'clip', parts: rows(20), wires: [], junctions: [] } });
    expect(test.sheet.parts).toHaveLength(21);
    expect(new Set(test.sheet.parts.map((part) => part.ref)).size).toBe(21);
    test.expectSound();
  });
});
