import { existsSync, mkdirSync, renameSync } from 'node:fs';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { runCommand } from '../machine/run-command.mjs';
import { step } from '../machine/say.mjs';
import { pruneBuilds } from './builds-in-use.mjs';
import { bundlePrograms } from './bundle-programs.mjs';
import { sourceHash } from './source-hash.mjs';
import { vendorEngine } from './vendor-engine.mjs';
import { withBuildLock } from './build-lock.mjs';

const workFolder = '.next-build';

/**
 * The production build of the sources as they stand: made when it is missing, in a folder of its own that is named after the
 * sources. A server that runs from an older build keeps its files.
 * @param {string} root
 * @param {{ quiet?: boolean }} [options]
 * @returns {Promise<string>} the build's folder, relative to `root`
 */
export async function ensureBuild(root, { quiet = true } = {}) {
  vendorEngine(root);
  const finished = `.next-${sourceHash(root)}`;
  if (existsSync(path.join(root, finished))) return finished;
  return withBuildLock(root, async () => {
    if (existsSync(path.join(root, finished))) return finished;
    step('Building (about half a minute; only when sources changed)');
    await build(root, finished, quiet);
    pruneBuilds(root, finished);
    return finished;
  });
}

/** @param {string} root @param {string} finished @param {boolean} quiet */
async function build(root, finished, quiet) {
  const at = (/** @type {string[]} */ ...parts) => path.join(root, ...parts);
  const next = at('node_modules/next/dist/bin/next');
  const env = { ...process.env, NODE_ENV: 'production', NEXT_TELEMETRY_DISABLED: '1', HOLDOFF_DIST_DIR: workFolder };
  await runCommand(process.execPath, [next, 'build', root], { quiet, cwd: root, env });
  await bundlePrograms(root, at(workFolder, 'programs'));
  renameSync(at(workFolder), at(finished));
  // The compiler's cache serves the next build; the server has no use for it.
  if (!existsSync(at(finished, 'cache'))) return;
  mkdirSync(at(workFolder), { recursive: true });
  renameSync(at(finished, 'cache'), at(workFolder, 'cache'));
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  const root = fileURLToPath(new URL('../..', import.meta.url));
  step(`Built in ${await ensureBuild(root, { quiet: false })}`);
}
