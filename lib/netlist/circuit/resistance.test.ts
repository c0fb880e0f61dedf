import { expect, test } from 'vitest';
import type { NetlistPart } from '../netlist';
import { buildGraph } from './graph';
import { resistanceBetween } from './resistance';

const part = (ref: string, kind: NetlistPart['kind'], a: string, b: string, value?: number): NetlistPart => ({
  id: ref, ref, kind, pins: kind === 'dc-source' ? { '+': a, '-': b } : { 1: a, 2: b }, facts: value === undefined ? {} : { value }, origins: {}, leftOpen: [],
});
const ohms = (parts: readonly NetlistPart[], from: string, to: string, gone: readonly string[] = []): number =>
  resistanceBetween(buildGraph(parts).edges, from, to, new Set(gone));

test('series, parallel and a balanced bridge', () => {
  expect(ohms([part('R1', 'resistor', 'a', 'b', 1e3), part('R2', 'resistor', 'b', '0', 2e3)], 'a', '0')).toBeCloseTo(3e3, 6);
  expect(ohms([part('R1', 'resistor', 'a', '0', 1e3), part('R2', 'resistor', 'a', '0', 1e3)], 'a', '0')).toBeCloseTo(500, 6);
  const bridge = [['R1', 'a', 'x', 1e3], ['R2', 'a', 'y', 1e3], ['R3', 'x', '0', 1e3], ['R4', 'y', '0', 1e3], ['R5', 'x', 'y', 47]] as const;
  expect(ohms(bridge.map(([ref, a, b, value]) => part(ref, 'resistor', a, b, value)), 'a', '0')).toBeCloseTo(1e3, 6);
});

test('sources are shorted, leads are wires, capacitors are open', () => {
  const parts = [part('R1', 'resistor', 'gate', 'bus', 22e3), part('V1', 'dc-source', 'bus', '0', 12), part('W1', 'removable-lead', 'gate', 'far'), part('C1', 'capacitor', 'x', '0', 1e-9)];
  expect(ohms(parts, 'gate', '0')).toBeCloseTo(22e3, 6);
  expect(ohms(parts, 'far', '0')).toBeCloseTo(22e3, 6);
  expect(ohms(parts, 'far', '0', ['W1'])).toBe(Infinity);
  expect(ohms(parts, 'x', '0')).toBe(Infinity);
  expect(ohms(parts, 'bus', '0')).toBe(0);
});
