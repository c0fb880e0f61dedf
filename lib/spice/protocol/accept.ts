import type { SimulationFailure, SimulationRequest, SimulationResult, WaveformRequest, WaveformResult } from '../engine';
import { classifyMessages } from './classify';
import { parseRawFile, type RawPlot } from './raw-file';

const plotNames = { op: 'Operating Point', tran: 'Transient Analysis', ac: 'AC Analysis' } as const;

/** A transient counts when it came this near to its end, as a part of it. */
const endTolerance = 1e-6;

/** What a worker brought back from one run. */
export interface RunReply {
  readonly nonce: string;
  readonly raw: Uint8Array | null;
  readonly errors: readonly string[];
}

/** Takes an operating point only when the run is this one, clean, complete and finite. */
export function acceptOperatingPoint(request: SimulationRequest, reply: RunReply): SimulationResult {
  const plot = acceptPlot(request, reply);
  if ('status' in plot) return plot;
  return {
    status: 'ok',
    values: Object.fromEntries(request.vectors.map((name) => [name, plot.real.get(name)?.[0] ?? Number.NaN])),
  };
}

/** Takes waveforms on the same terms; a `tran` must also have reached its end. */
export function acceptWaveforms(request: WaveformRequest, reply: RunReply): WaveformResult {
  const plot = acceptPlot(request, reply);
  if ('status' in plot) return plot;
  const axis = plot.real.get(request.analysis === 'tran' ? 'time' : 'frequency');
  if (axis === undefined) return failure('missing-vector', ['the run brought no axis']);
  const end = axis[axis.length - 1] ?? 0;
  if (request.stop !== undefined && end < request.stop * (1 - endTolerance)) {
    return failure('timestep', [`the run ended at ${end} s of ${request.stop} s`]);
  }
  return { status: 'ok', waveforms: { axis, real: pick(plot.real, request), imaginary: pick(plot.imaginary, request) } };
}

function acceptPlot(request: SimulationRequest | WaveformRequest, reply: RunReply): RawPlot | SimulationFailure {
  const fault = classifyMessages(reply.errors);
  const plot = reply.raw === null ? null : parseRawFile(reply.raw);
  if (plot === null || plot.title !== reply.nonce) return failure(fault ?? 'stale', reply.errors);
  if (fault !== null) return failure(fault, reply.errors);
  if (plot.plotName !== plotNames[request.analysis]) return failure('wrong-plot', [plot.plotName]);

  const absent = request.vectors.filter((name) => !plot.real.has(name));
  if (absent.length > 0) return failure('missing-vector', absent);
  const unbounded = [...plot.real, ...plot.imaginary].filter(([, values]) => !values.every(Number.isFinite));
  if (unbounded.length > 0) return failure('non-finite', unbounded.map(([name]) => name));
  return plot;
}

function pick(vectors: ReadonlyMap<string, Float64Array>, request: WaveformRequest): Record<string, Float64Array> {
  return Object.fromEntries(request.vectors.flatMap((name) => {
    const values = vectors.get(name);
    return values === undefined ? [] : [[name, values]];
  }));
}

function failure(status: SimulationFailure['status'], messages: readonly string[]): SimulationFailure {
  return { status, messages };
}
