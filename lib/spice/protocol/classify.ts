import type { FailureStatus } from '../engine';

/**
 * What ngspice says when a result must not be used, most telling first (`docs/engine.md` 1.3, step 6). `Transient op` is
 * among them: ngspice then integrates in time and reports where it stopped, which is a wrong operating point (1.4).
 */
const faults: readonly (readonly [RegExp, FailureStatus])[] = [
  [/singular matrix/i, 'singular'],
  [/circuit not parsed|Simulation interrupted/i, 'parse'],
  [/ignored!|is not a valid .* instance line|unrecognized parameter|too small, set to/i, 'parse-warn'],
  [/can't find model|could not find a valid modelname|unknown subckt/i, 'model'],
  [/Transient op|operating point could not be|no convergence|iteration limit/i, 'no-convergence'],
  [/timestep too small/i, 'timestep'],
  [/aborted|doAnalyses:/i, 'aborted'],
  [/no writable vector|no data saved|not available|no such vector/i, 'no-data'],
  [/Empty netlist|No job/i, 'no-job'],
  [/^Error/im, 'error'],
];

/** The fault that ngspice's error lines tell of; null when the run is clean. */
export function classifyMessages(messages: readonly string[]): FailureStatus | null {
  const text = messages.join('\n');
  return faults.find(([pattern]) => pattern.test(text))?.[1] ?? null;
}
