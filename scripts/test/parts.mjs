import path from 'node:path';
import { browserPart } from './browser.mjs';
import { runTool } from './child.mjs';
import { oneCheck, tallyFrom, vitestTally } from './tally.mjs';

/**
 * @typedef {{ root: string, scratch: string }} Place `scratch` is removed afterwards
 * @typedef {{ name: string, needs?: Readonly<Record<string, string>>, run: (place: Place) => Promise<import('./tally.mjs').Tally> }} TestPart
 */

const database = { mariadbd: 'mariadb-server' };

/** @type {readonly TestPart[]} */
export const testParts = [
  {
    name: 'lint',
    run: async ({ root, scratch }) => oneCheck((await runTool([inPackages(root, 'eslint/bin/eslint.js'), '.', '--max-warnings', '0'], { root, scratch })) === 0),
  },
  {
    name: 'types',
    run: async ({ root, scratch }) => {
      // Route types are made from the routes there are; a deleted one would otherwise haunt the check.
      const generated = await runTool([inPackages(root, 'next/dist/bin/next'), 'typegen', root], { root, scratch });
      const check = (/** @type {string} */ project) => runTool([inPackages(root, 'typescript/bin/tsc'), '--noEmit', '--project', path.join(root, project)], { root, scratch });
      return oneCheck(generated === 0 && (await check('tsconfig.json')) === 0 && (await check('scripts/tsconfig.json')) === 0);
    },
  },
  vitest('repo'),
  vitest('unit'),
  vitest('reference', { ngspice: 'ngspice' }),
  vitest('integration', database),
  vitest('access', database),
  vitest('realtime', database),
  vitest('lifecycle', database),
  browserPart,
];

/** @param {string} name @param {Readonly<Record<string, string>>} [needs] program → Debian package @returns {TestPart} */
function vitest(name, needs) {
  return {
    name, needs,
    run: async ({ root, scratch }) => {
      const report = path.join(scratch, `${name}.json`);
      const args = [inPackages(root, 'vitest/vitest.mjs'), 'run', '--project', name, '--reporter=default', '--reporter=json', `--outputFile.json=${report}`];
      return tallyFrom(report, await runTool(args, { root, scratch }), vitestTally);
    },
  };
}

/** @param {string} root @param {string} file */
function inPackages(root, file) {
  return path.join(root, 'node_modules', file);
}
