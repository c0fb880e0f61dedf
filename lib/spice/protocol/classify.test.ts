import { expect, it } from 'vitest';
import { classifyMessages } from './classify';

it.each([
  ['Warning: singular matrix:  check node n3', 'singular'],
  ['Error: circuit not parsed.', 'parse'],
  ['R1 a : ignored!', 'parse-warn'],
  ['Note: Transient op started', 'no-convergence'],
  ['doAnalyses: TRAN:  Timestep too small', 'timestep'],
  ['run simulation(s) aborted', 'aborted'],
  ['Error: something nobody has seen', 'error'],
])('takes "%s" for %s', (message, status) => {
  expect(classifyMessages(['Note: No compatibility mode selected!', message])).toBe(status);
});

it('lets notes on gmin and source stepping pass', () => {
  expect(classifyMessages([
    'Note: Starting dynamic gmin stepping', 'Warning: Dynamic gmin stepping failed', 'Note: Starting source stepping',
    'Note: Source stepping completed',
  ])).toBeNull();
});
