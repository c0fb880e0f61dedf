import { existsSync, mkdtempSync, readFileSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { isAlive } from '../machine/processes.mjs';
import { waitUntil } from '../machine/wait-until.mjs';
import { Part } from './part.mjs';

const guardian = path.resolve('scripts/parts/guardian.mjs');
const folder = () => mkdtempSync(path.join(tmpdir(), 'holdoff-part-'));

/** A part that writes its process number into `pid` and is ready when that is there. */
function plan(work: string, program = '') {
  const file = path.join(work, 'pid');
  const script = path.join(work, 'part.mjs');
  writeFileSync(script, `import { writeFileSync } from 'node:fs';\nwriteFileSync(${JSON.stringify(file)}, String(process.pid));\n${program}\nsetInterval(() => {}, 1000);\n`);
  return {
    file, script,
    plan: {
      name: 'Test part', command: process.execPath, args: ['--import', path.resolve('scripts/parts/end-with-parent.mjs'), script],
      env: process.env, logFile: path.join(work, 'log'), graceMs: 1_500, readyMs: 5_000, ready: () => existsSync(file),
    },
  };
}
const pidIn = (file: string) => Number(readFileSync(file, 'utf8'));

describe('a part', () => {
  it('is started again when it dies, and not after it was stopped', async () => {
    const { plan: planned, file } = plan(folder());
    const part = new Part(planned);
    await part.start();
    const first = pidIn(file);
    process.kill(first, 'SIGKILL');
    expect(await waitUntil(() => pidIn(file) !== first && isAlive(pidIn(file)), { timeoutMs: 5_000 })).toBe(true);
    const second = pidIn(file);
    await part.stop();
    expect(isAlive(second)).toBe(false);
    expect(part.holder?.pid).toBe(second);
  });

  it('is ended by force after its grace', async () => {
    const { plan: planned, file } = plan(folder(), "process.on('SIGTERM', () => {});");
    const part = new Part(planned);
    await part.start();
    await part.stop();
    expect(isAlive(pidIn(file))).toBe(false);
  });

  it('that cannot start says so with its last lines', async () => {
    const { plan: planned } = plan(folder(), "throw new Error('no such table');");
    await expect(new Part({ ...planned, ready: () => false }).start()).rejects.toThrow(/ended while starting[^]*no such table/);
  });
});

it('ends when the pipe of its parent closes', async () => {
  const { spawn } = await import('node:child_process');
  const work = folder();
  const { plan: planned, file, script } = plan(work);
  for (const args of [planned.args, [guardian, process.execPath, script]]) {
    writeFileSync(file, '');
    const child = spawn(process.execPath, args, { stdio: ['pipe', 'ignore', 'ignore'], env: { ...process.env, HOLDOFF_SUPERVISOR: String(process.pid) } });
    expect(await waitUntil(() => pidIn(file) > 0, { timeoutMs: 5_000 })).toBe(true);
    child.stdin.end();
    expect(await waitUntil(() => !isAlive(pidIn(file)), { timeoutMs: 5_000 })).toBe(true);
  }
});
