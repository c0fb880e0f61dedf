import { createHash } from 'node:crypto';
import { chmodSync, lstatSync, mkdirSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { Refusal } from '../machine/say.mjs';

/** Linux takes 108 bytes for a socket's path, the closing zero included; some room is kept. */
const longestSocketPath = 100;

/**
 * Everything one installation keeps, under one folder that only its owner may enter.
 * @param {string} root
 */
export function dataFolder(root) {
  for (const folder of [root, path.join(root, 'run'), path.join(root, 'logs')]) mkdirSync(folder, { recursive: true, mode: 0o700 });
  chmodSync(root, 0o700);
  return {
    root,
    lock: path.join(root, 'lock.json'),
    secrets: path.join(root, 'secrets.json'),
    demoAccounts: path.join(root, 'demo-accounts.json'),
    mail: path.join(root, 'mail'),
    files: path.join(root, 'files'),
    mariadb: path.join(root, 'mariadb'),
    pidFile: path.join(root, 'run', 'mariadb.pid'),
    initFile: path.join(root, 'run', 'accounts.sql'),
    socket: socketPath(root),
    /** @param {string} part */
    log: (part) => path.join(root, 'logs', `${part}.log`),
  };
}

/** @typedef {ReturnType<typeof dataFolder>} DataFolder */

/** In the data folder, or in a short private one of this account when the data folder's own path is too long. @param {string} root */
function socketPath(root) {
  const inside = path.join(root, 'run', 'mariadb.sock');
  if (Buffer.byteLength(inside) <= longestSocketPath) return inside;
  const mark = createHash('sha256').update(root).digest('hex').slice(0, 12);
  const folder = path.join(tmpdir(), `holdoff-${process.getuid?.() ?? 0}-${mark}`);
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  const found = lstatSync(folder);
  if (!found.isDirectory() || found.uid !== process.getuid?.() || (found.mode & 0o077) !== 0) {
    throw new Refusal(`${folder} belongs to somebody else or is open to others. Remove it, or choose a DATA_DIR with a shorter path.`);
  }
  return path.join(folder, 'mariadb.sock');
}
