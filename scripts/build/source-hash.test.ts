import { mkdirSync, mkdtempSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { expect, it } from 'vitest';
import { sourceHash } from './source-hash.mjs';

it('changes with a source and with nothing else', () => {
  const root = mkdtempSync(path.join(tmpdir(), 'holdoff-sources-'));
  mkdirSync(path.join(root, 'lib'));
  writeFileSync(path.join(root, 'lib/a.ts'), 'a');
  const first = sourceHash(root);
  writeFileSync(path.join(root, 'lib/a.test.ts'), 'a test');
  writeFileSync(path.join(root, 'README.md'), 'words');
  expect(sourceHash(root)).toBe(first);
  writeFileSync(path.join(root, 'lib/a.ts'), 'b');
  expect(sourceHash(root)).not.toBe(first);
  expect(first).toMatch(/^[0-9a-f]{12}$/);
});
