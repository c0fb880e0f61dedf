import path from 'node:path';
import { browserPart } from './browser.mjs';
import { withBuildLock } from '../build/build-lock.mjs';
import { runTool } from './child.mjs';
import { oneCheck, tallyFrom, vitestTally } from './tally.mjs';

/**
 * @typedef {{ root: string, scratch: string, output: 'inherit' | number }} Place `scratch` is removed afterwards; `output` is the terminal or a file's descriptor
 * @typedef {{ name: string, needs?: Readonly<Record<string, string>>, run: (place: Place) => Promise<import('./tally.mjs').Tally> }} TestPart
 */

const database = { mariadbd: 'mariadb-server' };

/** In the order in which they begin: what takes long starts early. @type {readonly TestPart[]} */
export const testParts = [
  {
    name: 'lint',
    run: async (place) => oneCheck((await runTool([inPackages(place.root, 'eslint/bin/eslint.js'), '.', '--max-warnings', '0'], place)) === 0),
  },
  {
    name: 'types',
    // A build writes types of its own beside these, and takes them away.
    run: (place) => withBuildLock(place.root, async () => {
      // Route types are made from the routes there are; a deleted one would otherwise haunt the check.
      const generated = await runTool([inPackages(place.root, 'next/dist/bin/next'), 'typegen', place.root], place);
      const check = (/** @type {string} */ project) => runTool([inPackages(place.root, 'typescript/bin/tsc'), '--noEmit', '--project', path.join(place.root, project)], place);
      return oneCheck(generated === 0 && (await check('tsconfig.json')) === 0 && (await check('scripts/tsconfig.json')) === 0);
    }),
  },
  vitest('integration', database),
  vitest('lifecycle', database),
  vitest('unit'),
  browserPart,
  vitest('reference', { ngspice: 'ngspice' }),
  vitest('realtime', database),
  vitest('access', database),
  vitest('repo'),
];

/** @param {string} name @param {Readonly<Record<string, string>>} [needs] program → Debian package @returns {TestPart} */
function vitest(name, needs) {
  return {
    name, needs,
    run: async (place) => {
      const { root, scratch } = place;
      const report = path.join(scratch, `${name}.json`);
      const args = [inPackages(root, 'vitest/vitest.mjs'), 'run', '--project', name, '--reporter=default', '--reporter=json', `--outputFile.json=${report}`];
      return tallyFrom(report, await runTool(args, place), vitestTally);
    },
  };
}

/** @param {string} root @param {string} file */
function inPackages(root, file) {
  return path.join(root, 'node_modules', file);
}
