import { linkSync, rmSync, writeFileSync } from 'node:fs';
import { commandLine, endProcess, isAlive, processIdentity } from '../machine/processes.mjs';
import { waitUntil } from '../machine/wait-until.mjs';
import { Refusal, step } from '../machine/say.mjs';
import { readPrivate, writePrivate } from './private-file.mjs';

/** @typedef {{ name?: string, pid: number, identity: string }} Holder */
/** @typedef {Holder & { address?: string, databaseUrl?: string, parts?: Holder[] }} Lock the file is private: it names the database's password */

/** @param {Holder | undefined} holder */
function lives(holder) {
  return holder !== undefined && isAlive(holder.pid) && processIdentity(holder.pid) === holder.identity;
}

/**
 * Takes the data folder for this process. A lock whose owner is gone is taken over, and what its owner left running is ended.
 * @param {import('./data-folder.mjs').DataFolder} data
 * @returns {Promise<{ note: (facts: Partial<Lock>) => void, release: () => void }>}
 */
export async function takeLock(data) {
  const mine = { pid: process.pid, identity: processIdentity(process.pid) };
  const offered = `${data.lock}.${process.pid}`;
  for (;;) {
    writeFileSync(offered, JSON.stringify(mine), { mode: 0o600 });
    try {
      linkSync(offered, data.lock);
      break;
    } catch (error) {
      if (/** @type {NodeJS.ErrnoException} */ (error).code !== 'EEXIST') throw error;
    } finally {
      rmSync(offered, { force: true });
    }
    /** @type {Lock | undefined} */
    const held = readPrivate(data.lock);
    if (held && lives(held)) {
      const where = held.address ? ` at ${held.address}` : '';
      throw new Refusal(`Already running${where} (process ${held.pid}, data in ${data.root}). Stop it with Ctrl-C there, or start beside it with another DATA_DIR.`);
    }
    step('Taking over from a start that did not end cleanly');
    await endLeftovers(held, data);
    rmSync(data.lock, { force: true });
  }
  let known = { ...mine };
  return {
    note: (facts) => {
      known = { ...known, ...facts };
      writePrivate(data.lock, known);
    },
    release: () => rmSync(data.lock, { force: true }),
  };
}

/** Parts end by themselves when their parent's pipe closes; those that do not are ended. @param {Lock | undefined} lock @param {import('./data-folder.mjs').DataFolder} data */
async function endLeftovers(lock, data) {
  const parts = (lock?.parts ?? []).filter(lives);
  await waitUntil(() => !parts.some(lives), { timeoutMs: 15_000, everyMs: 50 });
  await Promise.all(parts.filter(lives).map((part) => endProcess(part.pid, 2_000)));
  await endLeftoverServer(data);
}

/** Ends a MariaDB that still serves this data folder, whoever started it. @param {import('./data-folder.mjs').DataFolder} data */
export async function endLeftoverServer(data) {
  const pid = Number(readPrivate(data.pidFile));
  if (Number.isInteger(pid) && pid > 1 && commandLine(pid).includes(`--datadir=${data.mariadb}`)) await endProcess(pid, 20_000);
}
