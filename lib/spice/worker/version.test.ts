import { createHash } from 'node:crypto';
import { readFileSync } from 'node:fs';
import { expect, it } from 'vitest';
import release from './version.json';

const read = (name: string): string => readFileSync(new URL(name, import.meta.url), 'utf8');

it('changes its version with the worker files, because browsers keep them for a year', () => {
  const digest = createHash('sha256').update(read('engine-host.mjs')).update(read('browser-worker.mjs')).digest('hex');
  expect(release.digest, 'raise the version and set the digest to the new value').toBe(digest);
});

it('names the version of the engine package', () => {
  const manifest = JSON.parse(readFileSync('node_modules/eecircuit-engine/package.json', 'utf8')) as { version: string };
  expect(release.version.split('-')[0]).toBe(manifest.version);
});
