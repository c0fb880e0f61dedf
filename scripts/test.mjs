/**
 * `npm test`: prepares itself and runs every part, or those named (`node scripts/test.mjs unit access`). The last line is
 * `N passed, N failed`; lint and types count as one each. Leaves no process behind.
 */
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
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

try {
  await preparePackages(root);
  await ensurePrograms(Object.assign({}, ...chosen.map((part) => part.needs ?? {})));
  for (const part of chosen) {
    if (interruption.signal.aborted) break;
    step(`${part.name}`);
    const started = Date.now();
    const tally = await part.run({ root, scratch }).catch((error) => {
      process.stderr.write(`${words(error)}\n`);
      return { passed: 0, failed: 1 };
    });
    total.passed += tally.passed;
    total.failed += tally.failed;
    step(`${part.name}: ${tally.passed} passed, ${tally.failed} failed in ${Math.round((Date.now() - started) / 1000)} s`.replace(', ', ' and '));
  }
} catch (error) {
  process.stderr.write(`${words(error)}\n`);
  total.failed += 1;
} finally {
  rmSync(scratch, { recursive: true, force: true });
}
if (interruption.signal.aborted) total.failed += 1;
say(`${total.passed} passed, ${total.failed} failed`);
process.exit(total.failed === 0 ? 0 : 1);
