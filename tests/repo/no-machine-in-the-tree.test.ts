import { expect, it } from 'vitest';
import { textOf, trackedFiles } from './tracked-files';

const text = /\.(ts|tsx|mts|mjs|css|md|json|sql|yml|yaml|sh|cir)$|^\.(npmrc|gitignore|ci\/)|^(LICENSE)$/;
/** A home folder or a working folder of one machine, and package mirrors. */
const machine = /\/(home|Users)\/[a-z]+\/|\/work\/(main|shared)|\/tmp\/[a-z0-9]+\/|registry\.npm|npmmirror|verdaccio|artifactory/i;

it('names no path or registry of one machine', () => {
  const found = trackedFiles()
    .filter((file) => text.test(file) && file !== 'tests/repo/no-machine-in-the-tree.test.ts')
    .filter((file) => machine.test(textOf(file)));
  expect(found).toEqual([]);
});

it('holds no key, token or password file', () => {
  expect(trackedFiles().filter((file) => /(^|\/)(\.env(\..*)?|id_rsa|.*\.pem|.*\.key|secrets\.json)$/.test(file))).toEqual([]);
});
