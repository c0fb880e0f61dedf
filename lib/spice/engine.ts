/** What a caller asks of the engine: body lines without a title, and what must come back for the answer to count. */
export interface SimulationRequest {
  /** Element, `.model`, `.options`, `.save` and analysis lines; generated names and numbers only. */
  readonly lines: readonly string[];
  readonly analysis: 'op';
  /** Vectors that must be present, in raw-file names (`v(n1)`, `i(v2)`, `@r3[i]` as `i(@r3[i])`). */
  readonly vectors: readonly string[];
  readonly timeoutMs?: number;
}

/** A run over time or frequency. */
export interface WaveformRequest {
  readonly lines: readonly string[];
  readonly analysis: 'tran' | 'ac';
  readonly vectors: readonly string[];
  /** Seconds that a `tran` must reach for its answer to count. */
  readonly stop?: number;
  readonly timeoutMs?: number;
}

/** Outcomes of the guarded protocol (`docs/engine.md` 1.2, 1.3). */
export type FailureStatus =
  | 'parse' | 'parse-warn' | 'model' | 'singular' | 'no-convergence' | 'timestep' | 'aborted' | 'no-data' | 'no-job'
  | 'fatal' | 'timeout' | 'crash' | 'stale' | 'wrong-plot' | 'missing-vector' | 'non-finite' | 'error';

export interface SimulationFailure {
  readonly status: FailureStatus;
  readonly messages: readonly string[];
}

export type SimulationResult =
  | { readonly status: 'ok'; readonly values: Readonly<Record<string, number>> }
  | SimulationFailure;

export interface Waveforms {
  /** Seconds (`tran`, uneven steps) or hertz (`ac`). */
  readonly axis: Float64Array;
  readonly real: Readonly<Record<string, Float64Array>>;
  /** Imaginary parts of an `ac` run; empty for `tran`. */
  readonly imaginary: Readonly<Record<string, Float64Array>>;
}

export type WaveformResult = { readonly status: 'ok'; readonly waveforms: Waveforms } | SimulationFailure;

/** One guarded ngspice engine behind a worker. Runs are queued; a hung or poisoned worker is replaced. */
export interface Engine {
  simulate(request: SimulationRequest): Promise<SimulationResult>;
  /** Loads the engine ahead of the first run. */
  warm(): Promise<void>;
  /** `idle` until first used. */
  readonly state: 'idle' | 'starting' | 'ready' | 'failed';
  dispose(): Promise<void>;
}

/** An engine that also runs over time and frequency. */
export interface WaveformEngine extends Engine {
  waveforms(request: WaveformRequest): Promise<WaveformResult>;
}
