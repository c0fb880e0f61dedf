import { spawn } from 'node:child_process';
import path from 'node:path';
import { waitUntil } from '../machine/wait-until.mjs';

const accountLine = /^(\S+@\S+) {2}([A-Za-z0-9]+) {2}(maker|reviewer|mentor|steward|member)$/gm;

/**
 * A product as `npm start` gives it, on a data directory and ports of its own, for tests and measurements.
 * @param {{ root: string, dataFolder: string, env?: Readonly<Record<string, string | undefined>> }} input
 */
export async function startProduct({ root, dataFolder, env = {} }) {
  const overridden = Object.fromEntries(['PUBLIC_URL', 'HOST', 'REALTIME_PORT', 'REALTIME_URL', 'DATABASE_URL', 'SMTP_URL', 'S3_ENDPOINT', 'S3_BUCKET', 'TRUST_PROXY'].map((name) => [name, '']));
  // A group of its own: a signal to the tests is passed on once, by `stop`.
  const child = spawn(process.execPath, [path.join(root, 'scripts/start.mjs')], {
    cwd: root, detached: true, stdio: ['ignore', 'pipe', 'pipe'], env: { ...process.env, ...overridden, DATA_DIR: dataFolder, ...env },
  });
  let output = '';
  let ended = false;
  for (const stream of [child.stdout, child.stderr]) stream.on('data', (bytes) => { output += bytes; });
  const exited = new Promise((resolve) => child.once('close', (code) => { ended = true; resolve(code); }));
  const ready = await waitUntil(() => /Ctrl-C stops everything/.test(output), { timeoutMs: 300_000, everyMs: 50, until: () => ended });
  const stop = async () => {
    if (!ended) child.kill('SIGTERM');
    await exited;
  };
  if (!ready) {
    await stop();
    throw new Error(`The product did not start:\n${output.trim().split('\n').slice(-25).join('\n')}`);
  }
  return {
    address: /ready at (\S+)/.exec(output)?.[1] ?? '',
    accounts: [...output.matchAll(accountLine)].map(([, email = '', password = '', part = '']) => ({ email, password, part })),
    dataFolder,
    pid: child.pid ?? 0,
    /** @param {NodeJS.Signals} signal */
    signal: (signal) => child.kill(signal),
    output: () => output,
    exited,
    stop,
  };
}
