/**
 * `npm test`: prepares itself and runs every part, or those named (`node scripts/test.mjs unit access`). Where there are
 * two cores two parts run side by side, and what a part has to say is shown at its end. The last line is
 * `N passed, N failed`; lint and types count as one each. Leaves no process behind.
 */
import { closeSync, mkdtempSync, openSync, readFileSync, rmSync } from 'node:fs';
import { availableParallelism, tmpdir } from 'node:os';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { ensurePrograms } from './machine/debian-packages.mjs';
import { interruption, takeInterruptions } from './machine/interruption.mjs';
import { say, step, words } from './machine/say.mjs';
import { preparePackages } from './start/prepare-packages.mjs';
import { testParts } from './test/parts.mjs';

const root = fileURLToPath(new URL('..', import.meta.url));
const wanted = process.argv.slice(2);
const unknown = wanted.filter((name) => !testParts.some((part) => part.name === name));
if (unknown.length > 0) {
  process.stderr.write(`No part is called ${unknown.join(', ')}. There are ${testParts.map((part) => part.name).join(', ')}.\n`);
  process.exit(2);
}
const chosen = wanted.length === 0 ? testParts : testParts.filter((part) => wanted.includes(part.name));
const total = { passed: 0, failed: 0 };
const scratch = mkdtempSync(path.join(tmpdir(), 'holdoff-test-'));
takeInterruptions(() => process.exit(130));

/**
 * Runs a part and adds up; its output goes to the terminal at once, or to a file until it has ended.
 * @param {import('./test/parts.mjs').TestPart} part
 * @param {boolean} alone
 */
async function runPart(part, alone) {
  step(part.name);
  const started = Date.now();
  const said = path.join(scratch, `${part.name}.txt`);
  const output = alone ? 'inherit' : openSync(said, 'w');
  let failure = '';
  const tally = await part.run({ root, scratch, output }).catch((error) => {
    failure = `${words(error)}\n`;
    return { passed: 0, failed: 1 };
  });
  if (output !== 'inherit') {
    closeSync(output);
    process.stdout.write(readFileSync(said));
  }
  process.stderr.write(failure);
  total.passed += tally.passed;
  total.failed += tally.failed;
  step(`${part.name}: ${tally.passed} passed and ${tally.failed} failed in ${Math.round((Date.now() - started) / 1000)} s`);
}

try {
  await preparePackages(root);
  await ensurePrograms(Object.assign({}, ...chosen.map((part) => part.needs ?? {})));
  const waiting = [...chosen];
  const sideBySide = Math.min(chosen.length, availableParallelism(), 2);
  await Promise.all(Array.from({ length: sideBySide }, async () => {
    for (let part = waiting.shift(); part && !interruption.signal.aborted; part = waiting.shift()) await runPart(part, sideBySide === 1);
  }));
} catch (error) {
  process.stderr.write(`${words(error)}\n`);
  total.failed += 1;
} finally {
  rmSync(scratch, { recursive: true, force: true });
}
if (interruption.signal.aborted) total.failed += 1;
say(`${total.passed} passed, ${total.failed} failed`);
process.exit(total.failed === 0 ? 0 : 1);
