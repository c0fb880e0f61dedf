import { linkSync, mkdirSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { readPrivate } from '../data/private-file.mjs';
import { isAlive, processIdentity } from '../machine/processes.mjs';
import { step } from '../machine/say.mjs';
import { waitUntil } from '../machine/wait-until.mjs';

const longestBuildMs = 10 * 60_000;

/**
 * Runs one build of this tree at a time; a second one waits. A lock whose owner is gone counts for nothing.
 * @template T
 * @param {string} root
 * @param {() => Promise<T>} work
 * @returns {Promise<T>}
 */
export async function withBuildLock(root, work) {
  const folder = path.join(root, '.cache');
  const lock = path.join(folder, 'build-lock.json');
  mkdirSync(folder, { recursive: true });
  let said = false;
  const taken = await waitUntil(() => {
    if (takes(lock)) return true;
    const held = readPrivate(lock);
    if (held && isAlive(held.pid) && processIdentity(held.pid) === held.identity) {
      if (!said) step('Waiting for another build of this tree');
      said = true;
    } else {
      rmSync(lock, { force: true });
    }
    return false;
  }, { timeoutMs: longestBuildMs, everyMs: 200 });
  if (!taken) throw new Error('Another build of this tree has not finished for ten minutes');
  try {
    return await work();
  } finally {
    rmSync(lock, { force: true });
  }
}

/** @param {string} lock */
function takes(lock) {
  const offered = `${lock}.${process.pid}`;
  writeFileSync(offered, JSON.stringify({ pid: process.pid, identity: processIdentity(process.pid) }));
  try {
    linkSync(offered, lock);
    return true;
  } catch {
    return false;
  } finally {
    rmSync(offered, { force: true });
  }
}
