import path from 'node:path';

/** The linted file's path from the root, with forward slashes. @param {{ filename: string, cwd: string }} context */
export function fileFromRoot({ filename, cwd }) {
  return path.relative(cwd, filename).split(path.sep).join('/');
}
