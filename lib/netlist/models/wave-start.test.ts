import { expect, it } from 'vitest';
import type { Wave } from '../netlist';
import { waveStart } from './wave-start';

it.each<[Wave, number]>([
  [{ shape: 'sin', args: [5, 2, 1e3] }, 5],
  [{ shape: 'sin', args: [1, 2, 50, 0, 0, 30] }, 2],
  [{ shape: 'pulse', args: [0, 10, 0, 1e-9, 1e-9, 1e-6, 2e-6] }, 0],
  [{ shape: 'exp', args: [1.5, 4, 1e-6, 1e-6] }, 1.5],
  [{ shape: 'pwl', args: [0, 4, 1e-3, 8] }, 4],
])('%j begins at %d', (wave, start) => {
  expect(waveStart(wave)).toBeCloseTo(start, 12);
});
