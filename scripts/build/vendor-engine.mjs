import { copyFileSync, existsSync, mkdirSync, readFileSync, statSync } from 'node:fs';
import path from 'node:path';
import { fileURLToPath } from 'node:url';

/**
 * Puts the circuit engine and its browser worker under `public/vendor/engine-<version>/`, where the browser loads them as
 * they stand. Files already there with the same size are left alone; the folder's name changes with the contents.
 * @param {string} root
 */
export function vendorEngine(root) {
  const from = path.join(root, 'lib/spice/worker');
  const { version } = JSON.parse(readFileSync(path.join(from, 'version.json'), 'utf8'));
  const to = path.join(root, 'public/vendor', `engine-${version}`);
  mkdirSync(to, { recursive: true });
  for (const source of [
    path.join(from, 'browser-worker.mjs'),
    path.join(from, 'engine-host.mjs'),
    path.join(root, 'node_modules/eecircuit-engine/dist/eecircuit-engine.mjs'),
    path.join(root, 'node_modules/eecircuit-engine/LICENSE'),
  ]) {
    const target = path.join(to, path.basename(source));
    if (!existsSync(target) || statSync(target).size !== statSync(source).size) copyFileSync(source, target);
  }
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  vendorEngine(path.resolve(path.dirname(fileURLToPath(import.meta.url)), '../..'));
}
