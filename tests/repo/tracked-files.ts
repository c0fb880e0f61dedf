import { execFileSync } from 'node:child_process';
import { existsSync, readFileSync } from 'node:fs';
import path from 'node:path';

export const root = process.cwd();

/** Files of the repository, new ones included, ignored ones not; paths from the root. */
export function trackedFiles(): readonly string[] {
  const listed = execFileSync('git', ['-c', 'safe.directory=*', 'ls-files', '--cached', '--others', '--exclude-standard'], { cwd: root, encoding: 'utf8' });
  return listed.split('\n').filter((file) => file !== '' && existsSync(path.join(root, file)));
}

export function textOf(file: string): string {
  return readFileSync(path.join(root, file), 'utf8');
}

/** Files that people write in a programming language. */
export function sourceFiles(): readonly string[] {
  return trackedFiles().filter((file) => /\.(ts|tsx|mts|mjs|css)$/.test(file));
}
