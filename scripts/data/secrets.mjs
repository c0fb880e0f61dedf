import { existsSync } from 'node:fs';
import { randomInt } from 'node:crypto';
import { Refusal } from '../machine/say.mjs';
import { readPrivate, writePrivate } from './private-file.mjs';

// Without 0 and O, 1, l and I: people type these.
const letters = 'abcdefghijkmnopqrstuvwxyzABCDEFGHJKLMNPQRSTUVWXYZ23456789';

/** Random letters and digits, at least 5.8 bits each. @param {number} length */
export function randomWord(length) {
  return Array.from({ length }, () => letters[randomInt(letters.length)]).join('');
}

/**
 * The passwords of this data folder, made at the first start and kept (0600).
 * @param {string} file
 * @returns {{ rootPassword: string, accountPassword: string, internalSecret: string }}
 */
export function secrets(file) {
  const kept = readPrivate(file);
  if (kept) return kept;
  if (existsSync(file)) throw new Refusal(`${file} cannot be read. It holds this data folder's database passwords: bring it back from a backup.`);
  const made = { rootPassword: randomWord(24), accountPassword: randomWord(24), internalSecret: randomWord(40) };
  writePrivate(file, made);
  return made;
}
