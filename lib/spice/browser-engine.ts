import type { WaveformEngine } from './engine';
import { createGuardedEngine } from './pool/guarded-engine';
import type { WorkerPort } from './pool/worker-port';
import release from './worker/version.json';

/**
 * Where `scripts/build/vendor-engine.mjs` puts the worker and the engine. A worker obeys the policy of its own answer:
 * `script-src 'self' 'wasm-unsafe-eval'; connect-src 'self' data:`.
 */
const workerAddress = `/vendor/engine-${release.version}/browser-worker.mjs`;

/** The engine in one module worker; about 6 MB are fetched at the first run or `warm()`, and kept by the browser. */
export function createBrowserEngine(): WaveformEngine {
  return createGuardedEngine(openBrowserWorker);
}

function openBrowserWorker(): WorkerPort {
  const worker = new Worker(workerAddress, { type: 'module', name: 'circuit engine' });
  return {
    post: (job) => worker.postMessage(job),
    listen: ({ message, failure }) => {
      worker.addEventListener('message', (event) => message(event.data));
      worker.addEventListener('error', (event) => failure(event.message || 'the engine could not be loaded'));
    },
    terminate: () => {
      worker.terminate();
      return Promise.resolve();
    },
    hold: () => {},
  };
}
