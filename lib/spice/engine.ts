/** What a caller asks of the engine: body lines without a title, and what must come back for the answer to count. */
export interface SimulationRequest {
  /** Element, `.model`, `.options`, `.save` and analysis lines; generated names and numbers only. */
  readonly lines: readonly string[];
  readonly analysis: 'op';
  /** Vectors that must be present, in raw-file names (`v(n1)`, `i(v2)`, `@r3[i]` as `i(@r3[i])`). */
  readonly vectors: readonly string[];
  readonly timeoutMs?: number;
}

/** Outcomes of the guarded protocol (`docs/engine.md` 1.2, 1.3). */
export type FailureStatus =
  | 'parse' | 'parse-warn' | 'model' | 'singular' | 'no-convergence' | 'timestep' | 'aborted' | 'no-data' | 'no-job'
  | 'fatal' | 'timeout' | 'crash' | 'stale' | 'wrong-plot' | 'missing-vector' | 'non-finite' | 'error';

export type SimulationResult =
  | { readonly status: 'ok'; readonly values: Readonly<Record<string, number>> }
  | { readonly status: FailureStatus; readonly messages: readonly string[] };

/** One guarded ngspice engine behind a worker. Runs are queued; a hung or poisoned worker is replaced. */
export interface Engine {
  simulate(request: SimulationRequest): Promise<SimulationResult>;
  /** Loads the engine ahead of the first run. */
  warm(): Promise<void>;
  /** `idle` until first used. */
  readonly state: 'idle' | 'starting' | 'ready' | 'failed';
  dispose(): Promise<void>;
}
