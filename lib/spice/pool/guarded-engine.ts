import type {
  Engine, SimulationFailure, SimulationRequest, SimulationResult, WaveformEngine, WaveformRequest, WaveformResult,
} from '../engine';
import { acceptOperatingPoint, acceptWaveforms, type RunReply } from '../protocol/accept';
import { deckText, freshNonce, lineFault } from '../protocol/deck-text';
import { EngineSlot } from './engine-slot';
import type { OpenWorker } from './worker-port';

/** Watchdogs by analysis, ms (`docs/engine.md` 1.3, step 1). */
const runMs = { op: 3_000, tran: 30_000, ac: 5_000 } as const;

export interface EngineOptions {
  /** Workers side by side; each takes about 200 MB. */
  readonly workers?: number;
  readonly startMs?: number;
  readonly runsPerWorker?: number;
}

interface Waiting {
  readonly take: (slot: EngineSlot) => void;
  readonly refuse: () => void;
}

/** The guarded protocol over any kind of worker: queue, watchdog, replacement and acceptance. */
export function createGuardedEngine(open: OpenWorker, options: EngineOptions = {}): WaveformEngine {
  const limits = { startMs: options.startMs ?? 60_000, runsPerWorker: options.runsPerWorker ?? 1_000 };
  const slots = Array.from({ length: Math.max(1, options.workers ?? 1) }, () => new EngineSlot(open, limits));
  const free = [...slots].reverse();
  const queue: Waiting[] = [];
  let state: Engine['state'] = 'idle';
  let disposed = false;

  const release = (slot: EngineSlot): void => {
    const next = queue.shift();
    if (next === undefined) free.push(slot);
    else next.take(slot);
  };

  const claim = (): Promise<EngineSlot | null> => {
    const slot = disposed ? undefined : free.pop();
    if (disposed || slot !== undefined) return Promise.resolve(slot ?? null);
    return new Promise((resolve) => queue.push({ take: resolve, refuse: () => resolve(null) }));
  };

  const start = async (slot: EngineSlot): Promise<void> => {
    if (!slot.ready && state !== 'ready') state = 'starting';
    const failure = await slot.start();
    state = failure === null ? 'ready' : 'failed';
  };

  const run = async (request: SimulationRequest | WaveformRequest): Promise<RunReply | SimulationFailure> => {
    const fault = firstFault(request.lines);
    if (fault !== null) return { status: 'error', messages: [fault] };
    const slot = await claim();
    if (slot === null) return { status: 'crash', messages: ['the engine was closed'] };
    try {
      await start(slot);
      const nonce = freshNonce();
      const reply = await slot.run(deckText(nonce, request.lines), request.timeoutMs ?? runMs[request.analysis]);
      if (reply.ending !== 'done') return { status: reply.ending, messages: reply.errors };
      return { nonce, raw: reply.raw, errors: reply.errors };
    } finally {
      release(slot);
    }
  };

  return {
    get state() {
      return state;
    },
    async simulate(request): Promise<SimulationResult> {
      const reply = await run(request);
      return 'status' in reply ? reply : acceptOperatingPoint(request, reply);
    },
    async waveforms(request): Promise<WaveformResult> {
      const reply = await run(request);
      return 'status' in reply ? reply : acceptWaveforms(request, reply);
    },
    async warm() {
      await Promise.all(slots.map(start));
    },
    async dispose() {
      disposed = true;
      for (const waiting of queue.splice(0)) waiting.refuse();
      await Promise.all(slots.map((slot) => slot.end()));
      state = 'idle';
    },
  };
}

function firstFault(lines: readonly string[]): string | null {
  for (const [index, line] of lines.entries()) {
    const fault = lineFault(line);
    if (fault !== null) return `line ${index + 1} was not run: ${fault}`;
  }
  return null;
}
