import { readFileSync } from 'node:fs';
import { waitUntil } from './wait-until.mjs';

/** True while the process is there and has not ended. @param {number} pid */
export function isAlive(pid) {
  try {
    process.kill(pid, 0);
  } catch (error) {
    return /** @type {NodeJS.ErrnoException} */ (error).code === 'EPERM';
  }
  // A process that ended but was not waited for still has an entry.
  return processStat(pid)?.state !== 'Z';
}

/** @param {number} pid */
function processStat(pid) {
  try {
    const text = readFileSync(`/proc/${pid}/stat`, 'latin1');
    const fields = text.slice(text.lastIndexOf(')') + 2).split(' ');
    return { state: fields[0], started: fields[19] };
  } catch {
    return undefined;
  }
}

/** Tells a process from a later one with the same number; '' where the system does not say. @param {number} pid */
export function processIdentity(pid) {
  return processStat(pid)?.started ?? '';
}

/** The command line of a process, or '' when it cannot be read. @param {number} pid */
export function commandLine(pid) {
  try {
    return readFileSync(`/proc/${pid}/cmdline`, 'utf8').replaceAll('\0', ' ').trim();
  } catch {
    return '';
  }
}

/**
 * Ends a process: SIGTERM, then SIGKILL when it is still there after the grace.
 * @param {number} pid
 * @param {number} graceMs
 */
export async function endProcess(pid, graceMs) {
  for (const [signal, timeoutMs] of /** @type {const} */ ([['SIGTERM', graceMs], ['SIGKILL', 5_000]])) {
    if (!isAlive(pid)) return;
    try {
      process.kill(pid, signal);
    } catch {
      return;
    }
    if (await waitUntil(() => !isAlive(pid), { timeoutMs })) return;
  }
}
