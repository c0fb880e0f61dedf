import { mkdirSync, mkdtempSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { expect, it } from 'vitest';
import { packagesMatch } from './prepare-packages.mjs';

function tree(locked: object, installed?: object): string {
  const root = mkdtempSync(path.join(tmpdir(), 'holdoff-lock-'));
  writeFileSync(path.join(root, 'package-lock.json'), JSON.stringify({ packages: { '': {}, ...locked } }));
  if (installed) {
    mkdirSync(path.join(root, 'node_modules'));
    writeFileSync(path.join(root, 'node_modules/.package-lock.json'), JSON.stringify({ packages: installed }));
  }
  return root;
}

const a = { 'node_modules/a': { version: '1.0.0' } };

it('is content when what is installed is what is locked', () => expect(packagesMatch(tree(a, a))).toBe(true));
it('notices that nothing is installed', () => expect(packagesMatch(tree(a))).toBe(false));
it('notices another version', () => expect(packagesMatch(tree(a, { 'node_modules/a': { version: '1.0.1' } }))).toBe(false));
it('notices a package that is locked no more', () => expect(packagesMatch(tree({}, a))).toBe(false));
it('does not miss an optional package of another machine', () => {
  expect(packagesMatch(tree({ ...a, 'node_modules/b': { version: '2.0.0', optional: true } }, a))).toBe(true);
});
