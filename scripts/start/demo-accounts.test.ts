import { mkdtempSync, statSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { expect, it } from 'vitest';
import { writePrivate } from '../data/private-file.mjs';
import { demoAccountLines } from './demo-accounts.mjs';

const folder = mkdtempSync(path.join(tmpdir(), 'holdoff-demo-'));

it('prints each account on a line with nothing else, the maker first', () => {
  const file = path.join(folder, 'accounts.json');
  writePrivate(file, [
    { email: 'noor@northgate.test', password: 'aB3', part: 'steward' },
    { email: 'ines@northgate.test', password: 'k7Qm2xW9pT4z', part: 'maker' },
  ]);
  expect(demoAccountLines(file)).toEqual(['ines@northgate.test  k7Qm2xW9pT4z  maker', 'noor@northgate.test  aB3  steward']);
  expect(statSync(file).mode & 0o777).toBe(0o600);
});

it('prints none where there is no demo', () => {
  expect(demoAccountLines(path.join(folder, 'none.json'))).toEqual([]);
});
