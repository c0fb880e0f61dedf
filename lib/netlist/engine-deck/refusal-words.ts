import type { Refusal } from '../points/point';
import type { EngineNames } from './engine-names';

/** What a guarded run that gave no result means to a person (docs/engine.md 1.2). */
const words: Readonly<Record<string, string>> = {
  singular: 'nothing sets the voltage of a node at DC, or sources close a ring',
  'no-convergence': 'the circuit has no operating point that the engine can find reliably',
  timestep: 'the run stopped before its end',
  timeout: 'the run took too long and was stopped',
  parse: 'the engine could not read the circuit',
  'parse-warn': 'the engine changed a value that it cannot use, such as 0 Ω',
  model: 'a model is missing',
  aborted: 'the engine gave up, as with a source shorted on itself',
  fatal: 'the engine ended itself, as with an unknown model parameter',
  crash: 'the engine could not be started',
  'non-finite': 'a result is no finite number',
};

/** Refusal of a run that the engine's guard did not let pass. */
export function engineRefusal(status: string, messages: readonly string[], names: EngineNames): Refusal {
  const nodes = names.named(messages);
  const where = nodes.length === 0 ? '' : ` (${nodes.slice(0, 4).join(', ')})`;
  return { code: 'engine', words: `${words[status] ?? `the engine answered '${status}'`}${where}`, nodes, parts: [] };
}
