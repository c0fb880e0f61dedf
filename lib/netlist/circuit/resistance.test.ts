import { describe, expect, it } from 'vitest';
import type { NetlistPart } from '../netlist';
import type { Edge } from './graph';
import { resistanceBetween } from './resistance';

function resistor(a: string, b: string, ohms: number): Edge {
  const id = `${a} ${b}`;
  const part: NetlistPart = { id, ref: id, kind: 'resistor', pins: { 1: a, 2: b }, facts: { value: ohms }, origins: {}, leftOpen: [] };
  return { part, a, b, aPin: '1', bPin: '2', nature: 'resistor' };
}

describe('resistanceBetween', () => {
  it('adds in series and in parallel', () => {
    expect(resistanceBetween([resistor('a', 'm', 10), resistor('m', 'b', 20)], 'a', 'b')).toBeCloseTo(30, 9);
    expect(resistanceBetween([resistor('a', 'b', 30), resistor('a', 'm', 20), resistor('m', 'b', 40)], 'a', 'b')).toBeCloseTo(20, 9);
  });

  it('solves a bridge that is neither (five resistors, 1 Ω balanced; 7/5 Ω with arms 1, 2, 2, 1 and bridge 1)', () => {
    const bridge = (r1: number, r2: number, r3: number, r4: number) =>
      [resistor('a', 'l', r1), resistor('l', 'b', r2), resistor('a', 'r', r3), resistor('r', 'b', r4), resistor('l', 'r', 1)];
    expect(resistanceBetween(bridge(1, 1, 1, 1), 'a', 'b')).toBeCloseTo(1, 9);
    expect(resistanceBetween(bridge(1, 2, 2, 1), 'a', 'b')).toBeCloseTo(7 / 5, 9);
  });

  it('is the same from either end, whatever hangs behind them', () => {
    const behind = [resistor('b', 'x', 5), resistor('x', 'y', 5), resistor('y', 'b', 5), resistor('a', 'z', 3)];
    const between = [resistor('a', 'm', 10), resistor('m', 'b', 20)];
    expect(resistanceBetween([...between, ...behind], 'a', 'b')).toBeCloseTo(30, 9);
    expect(resistanceBetween([...between, ...behind], 'b', 'a')).toBeCloseTo(30, 9);
  });

  it('is 0 for one net, Infinity without a path or with the path taken out', () => {
    expect(resistanceBetween([], 'a', 'a')).toBe(0);
    expect(resistanceBetween([resistor('a', 'x', 1)], 'a', 'b')).toBe(Infinity);
    expect(resistanceBetween([resistor('a', 'b', 1)], 'a', 'b', new Set(['a b']))).toBe(Infinity);
  });
});
