import { spawn } from 'node:child_process';
import { interruption } from '../machine/interruption.mjs';

/**
 * Runs a test tool in a process group of its own, shows its output, and leaves nothing of the group behind.
 * @param {readonly string[]} args arguments of node
 * @param {import('./parts.mjs').Place} place `scratch` takes its temporary files
 * @param {NodeJS.ProcessEnv} [env]
 * @returns {Promise<number>} its exit code, 1 when a signal ended it
 */
export function runTool(args, { root, scratch, output }, env = {}) {
  return new Promise((resolve) => {
    const child = spawn(process.execPath, args, {
      cwd: root, detached: true, stdio: ['ignore', output, output],
      env: { ...process.env, TMPDIR: scratch, NEXT_TELEMETRY_DISABLED: '1', NO_COLOR: process.stdout.isTTY ? process.env.NO_COLOR : '1', ...env },
    });
    const end = () => child.kill('SIGTERM');
    interruption.signal.addEventListener('abort', end);
    child.once('error', () => resolve(1));
    child.once('exit', (code) => {
      interruption.signal.removeEventListener('abort', end);
      try {
        if (child.pid) process.kill(-child.pid, 'SIGKILL');
      } catch {
        // The group is gone, as it should be.
      }
      resolve(code ?? 1);
    });
  });
}
