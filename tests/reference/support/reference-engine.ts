import { afterAll, beforeAll } from 'vitest';
import { createNodeEngine } from '@/lib/spice/node-engine';
import type { WaveformRequest } from '@/lib/spice/engine';
import type { Waveform } from './waveform';

/** As the product's decks: models from ratings stand for 25 °C, and ngspice's own tolerance leaves 0.4 % at a 30 V zener. */
export const roomTemperature = '.options temp=25 tnom=25 reltol=1e-4';

export interface ReferenceEngine {
  /** An operating point; throws what the guard refused. */
  point(lines: readonly string[], vectors: readonly string[]): Promise<Readonly<Record<string, number>>>;
  /** One waveform of a transient, or the magnitude of an AC run. */
  waveform(analysis: WaveformRequest['analysis'], lines: readonly string[], vector: string): Promise<Waveform>;
}

/** One guarded engine for a test file. */
export function referenceEngine(): ReferenceEngine {
  const engine = createNodeEngine();
  beforeAll(() => engine.warm());
  afterAll(() => engine.dispose());
  return {
    async point(lines, vectors) {
      const result = await engine.simulate({ lines: [...lines, '.op'], analysis: 'op', vectors });
      if (result.status !== 'ok') throw new Error(`${result.status}: ${result.messages.join('; ')}`);
      return result.values;
    },
    async waveform(analysis, lines, vector) {
      const result = await engine.waveforms({ lines, analysis, vectors: [vector] });
      if (result.status !== 'ok') throw new Error(`${result.status}: ${result.messages.join('; ')}`);
      const { axis, real, imaginary } = result.waveforms;
      const re = real[vector] as Float64Array;
      const im = imaginary[vector];
      return { axis, values: im === undefined ? re : re.map((value, index) => Math.hypot(value, im[index] as number)) };
    },
  };
}

/** Difference as a part of what is expected, in percent. */
export function percentOff(measured: number, expected: number): number {
  return Math.abs(measured / expected - 1) * 100;
}
