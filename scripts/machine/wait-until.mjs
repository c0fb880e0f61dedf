/**
 * Asks again until the answer is true.
 * @param {() => Promise<boolean> | boolean} condition one that throws counts as false
 * @param {{ timeoutMs: number, everyMs?: number, signal?: AbortSignal, until?: () => boolean }} options `until`: give up when it says so
 * @returns {Promise<boolean>} false when the time ran out, the signal came or `until` gave up
 */
export async function waitUntil(condition, { timeoutMs, everyMs = 25, signal, until }) {
  const end = Date.now() + timeoutMs;
  for (;;) {
    if (signal?.aborted || until?.()) return false;
    try {
      if (await condition()) return true;
    } catch {
      // Not yet.
    }
    if (Date.now() >= end) return false;
    await new Promise((resolve) => setTimeout(resolve, everyMs));
  }
}
