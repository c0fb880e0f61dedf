import { setImmediate } from 'node:timers/promises';

/** Waits for a condition without a timer's grain: looks again each time the process has handled what came in. */
export async function until(what: string, condition: () => boolean, timeoutMs = 10_000): Promise<void> {
  const end = performance.now() + timeoutMs;
  while (!condition()) {
    if (performance.now() > end) throw new Error(`Waited ${timeoutMs} ms for ${what}.`);
    await setImmediate();
  }
}
