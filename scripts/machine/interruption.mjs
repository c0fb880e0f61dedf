/** Aborts once, when this process is asked to end (Ctrl-C, SIGTERM, SIGHUP) or has to. */
export const interruption = new AbortController();

/** The abort's reason when a person or another program asked. */
export const askedToEnd = 'asked to end';

const oneAskMs = 1_000;
/** When the first signal came; 0 before. */
let askedAt = 0;

/**
 * Takes the signals that ask to end. The terminal and npm both pass Ctrl-C on, so a second one within a second is the
 * same one; a later one calls `insist`.
 * @param {() => void} insist
 */
export function takeInterruptions(insist) {
  for (const signal of /** @type {const} */ (['SIGINT', 'SIGTERM', 'SIGHUP'])) {
    process.on(signal, () => {
      const now = Date.now();
      if (askedAt === 0) {
        askedAt = now;
        interruption.abort(askedToEnd);
      } else if (now - askedAt > oneAskMs) {
        insist();
      }
    });
  }
}
