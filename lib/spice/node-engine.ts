import { existsSync } from 'node:fs';
import path from 'node:path';
import { Worker } from 'node:worker_threads';
import type { WaveformEngine } from './engine';
import { createGuardedEngine, type EngineOptions } from './pool/guarded-engine';
import type { WorkerPort } from './pool/worker-port';

export interface NodeEngineOptions extends EngineOptions {
  /** The project's folder; the working directory unless given. */
  readonly root?: string;
}

/**
 * The engine in worker threads. The worker file is loaded from the project's folder as it stands, not bundled: the same
 * path serves tsx, vitest, an esbuild bundle and Next's server, as long as the process runs in the project's folder.
 * Workers start with the first run or `warm()`; a waiting worker keeps no process alive.
 */
export function createNodeEngine(options: NodeEngineOptions = {}): WaveformEngine {
  const { worker } = engineFiles(options.root);
  return createGuardedEngine(() => openNodeWorker(worker), options);
}

/** Whether the files that the engine needs are there, without loading them. */
export function engineFilesPresent(root?: string): boolean {
  return Object.values(engineFiles(root)).every((file) => existsSync(file));
}

function engineFiles(root?: string): { readonly worker: string; readonly engine: string } {
  const folder = root ?? path.join(/* turbopackIgnore: true */ process.cwd());
  return {
    worker: path.join(folder, 'lib/spice/worker/node-worker.mjs'),
    engine: path.join(folder, 'node_modules/eecircuit-engine/dist/eecircuit-engine.mjs'),
  };
}

function openNodeWorker(file: string): WorkerPort {
  // The parent's loader flags (tsx, vitest) are not for the worker: it is plain JavaScript.
  const worker = new Worker(file, { execArgv: [], stdout: true, stderr: true });
  worker.unref();
  return {
    post: (job) => worker.postMessage(job),
    listen: ({ message, failure }) => {
      worker.on('message', message);
      worker.on('error', (error) => failure(String(error).slice(0, 500)));
      worker.on('exit', (code) => failure(`the worker ended with code ${code}`));
    },
    terminate: async () => {
      await worker.terminate();
    },
    hold: (working) => (working ? worker.ref() : worker.unref()),
  };
}
