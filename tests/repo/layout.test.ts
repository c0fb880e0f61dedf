import { describe, expect, it } from 'vitest';
import { sourceFiles, textOf, trackedFiles } from './tracked-files';

const topFolders = ['.ci', 'app', 'components', 'db', 'lib', 'public', 'realtime', 'scripts', 'tests'];
const topFiles = [
  '.gitignore', '.npmrc', 'DEVELOPERS.md', 'LICENSE', 'NOTICE.md', 'README.md', 'drizzle.config.ts', 'eslint.config.mjs', 'instrumentation.ts',
  'next.config.mjs', 'package-lock.json', 'package.json', 'playwright.config.ts', 'postcss.config.mjs', 'proxy.ts', 'tsconfig.json', 'vitest.config.mts',
];

/** Next prescribes brackets, parentheses and some names. */
const kebab = /^(\(?[a-z0-9]+(-[a-z0-9]+)*\)?|\[(\.\.\.)?[a-z][a-zA-Z]*\]|\[\[\.\.\.[a-z]+\]\])(\.[a-z0-9-]+)*$/;

describe('the layout', () => {
  it('has only the known names at the top', () => {
    const tops = new Set(trackedFiles().map((file) => file.split('/')[0]));
    expect([...tops].filter((name) => ![...topFolders, ...topFiles].includes(name ?? ''))).toEqual([]);
  });

  it('names source files and folders in kebab-case', () => {
    const wrong = sourceFiles().filter((file) => file.includes('/')).filter((file) => file.split('/').some((part) => !kebab.test(part) && part !== '.ci'));
    expect(wrong).toEqual([]);
  });

  it('has no catch-all files and no barrels', () => {
    const wrong = sourceFiles().filter((file) => /(^|\/)(helpers?|misc|utils?|common|index)\.[cm]?(tsx?|js)$/.test(file));
    expect(wrong).toEqual([]);
  });

  it('goes at most eight folders deep', () => {
    expect(trackedFiles().filter((file) => file.split('/').length > 9)).toEqual([]);
  });

  it('keeps files short: nothing over 600 lines, 95 of 100 under 300, half under 80', () => {
    const lengths = sourceFiles()
      .filter((file) => !file.startsWith('db/migrations/'))
      .map((file) => ({ file, lines: textOf(file).split('\n').length }))
      .toSorted((a, b) => a.lines - b.lines);
    expect(lengths.filter(({ lines }) => lines > 600)).toEqual([]);
    expect(lengths[Math.floor(lengths.length * 0.95)]?.lines).toBeLessThanOrEqual(300);
    expect(lengths[Math.floor(lengths.length / 2)]?.lines).toBeLessThanOrEqual(80);
  });

  it('keeps routes thin: page.tsx ≤ 80 lines, route.ts ≤ 40', () => {
    const long = sourceFiles().filter((file) => /^app\/.*\/(page\.tsx|route\.ts)$/.test(file))
      .filter((file) => textOf(file).split('\n').length > (file.endsWith('route.ts') ? 41 : 81));
    expect(long).toEqual([]);
  });
});
