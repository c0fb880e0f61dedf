import { readFileSync, renameSync, writeFileSync } from 'node:fs';

/** Writes JSON that only its owner may read; whole or not at all. @param {string} file @param {unknown} value */
export function writePrivate(file, value) {
  const partial = `${file}.${process.pid}`;
  writeFileSync(partial, `${JSON.stringify(value, null, 2)}\n`, { mode: 0o600 });
  renameSync(partial, file);
}

/** The JSON of a file, or undefined when it is not there or not JSON. @param {string} file */
export function readPrivate(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8'));
  } catch {
    return undefined;
  }
}
