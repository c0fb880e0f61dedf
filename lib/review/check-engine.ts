import { availableParallelism } from 'node:os';
import type { Engine } from '@/lib/spice/engine';
import { createNodeEngine, engineFilesPresent } from '@/lib/spice/node-engine';

const shared = globalThis as typeof globalThis & { holdoffEngine?: Engine };

/** The process's engine: one queue, a worker for each core less one, started with the first run. */
export function checkEngine(): Engine {
  shared.holdoffEngine ??= createNodeEngine({ workers: Math.max(1, availableParallelism() - 1) });
  return shared.holdoffEngine;
}

/** `idle` until first used; `down` when its files are missing or its worker did not start. */
export function engineState(): 'idle' | 'ok' | 'down' {
  if (!engineFilesPresent()) return 'down';
  const state = shared.holdoffEngine?.state ?? 'idle';
  if (state === 'failed') return 'down';
  return state === 'idle' ? 'idle' : 'ok';
}
