/**
 * `npm run soak`: the long runs that are too much for `npm test`. The model of the review: a million random acts (or as many as
 * given: `npm run soak -- 50000`), from a seed that is printed, so that a failure can be played again with REVIEW_MODEL_SEED.
 */
import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { ensurePrograms } from './machine/debian-packages.mjs';
import { step } from './machine/say.mjs';
import { preparePackages } from './start/prepare-packages.mjs';
import { runTool } from './test/child.mjs';

const root = fileURLToPath(new URL('..', import.meta.url));
const steps = Number(process.argv[2] ?? 1_000_000);
const seed = process.env.REVIEW_MODEL_SEED ?? String(Date.now() % 1_000_000_000);
await preparePackages(root);
await ensurePrograms({ mariadbd: 'mariadb-server' });
const scratch = mkdtempSync(path.join(tmpdir(), 'holdoff-soak-'));
step(`The model of the review: ${steps} acts, seed ${seed}`);
const code = await runTool(
  [path.join(root, 'node_modules/vitest/vitest.mjs'), 'run', '--project', 'integration', 'tests/integration/review-model'],
  { root, scratch, output: 'inherit' }, { REVIEW_MODEL_STEPS: String(steps), REVIEW_MODEL_SEED: seed },
);
rmSync(scratch, { recursive: true, force: true });
process.exit(code);
