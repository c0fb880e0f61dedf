/** One run, as a worker is given it. */
export interface EngineJob {
  readonly id: number;
  /** Whole deck, its title the nonce of this run. */
  readonly deck: string;
  /** Raw file that stands where the engine package looks for its own result (`docs/engine.md` 1.3, step 3). */
  readonly sentinel: Uint8Array;
}

/** What a worker says. */
export type WorkerMessage =
  | { readonly type: 'ready' }
  | { readonly type: 'failed'; readonly words: string }
  | { readonly type: 'done'; readonly id: number; readonly raw: Uint8Array | null; readonly errors: readonly string[] }
  /** ngspice ended itself: the worker can only be thrown away. */
  | { readonly type: 'fatal'; readonly id: number; readonly errors: readonly string[] };
