import { createHash } from 'node:crypto';
import { readdirSync, readFileSync, existsSync, statSync } from 'node:fs';
import path from 'node:path';

/** What a build is made of. Tests are not; `public/vendor` is made by the build itself. */
const sources = [
  'app', 'components', 'db', 'lib', 'public', 'realtime', 'scripts/build', 'scripts/programs',
  'next.config.mjs', 'postcss.config.mjs', 'proxy.ts', 'tsconfig.json', 'package-lock.json', 'instrumentation.ts',
];
const leftOut = /\.test\.[cm]?tsx?$|^public\/vendor(\/|$)/;

/** Mark of the sources as they stand: the same files give the same 12 hex digits. @param {string} root */
export function sourceHash(root) {
  const hash = createHash('sha256');
  for (const file of sources.flatMap((name) => filesBelow(root, name)).sort()) {
    hash.update(file).update('\0').update(readFileSync(path.join(root, file))).update('\0');
  }
  return hash.digest('hex').slice(0, 12);
}

/** @param {string} root @param {string} name @returns {string[]} */
function filesBelow(root, name) {
  const full = path.join(root, name);
  if (leftOut.test(name) || !existsSync(full)) return [];
  if (!statSync(full).isDirectory()) return [name];
  return readdirSync(full).flatMap((entry) => filesBelow(root, path.posix.join(name, entry)));
}
