import { spawn, type ChildProcess } from 'node:child_process';
import { mkdirSync, rmSync } from 'node:fs';
import path from 'node:path';
import { build } from 'esbuild';
import { waitFor } from '@/realtime/testing/wait-for';
import { anyFreePort } from '../../../scripts/machine/free-port.mjs';
import { pageOrigin, secret } from './sheet-world';

const root = path.resolve(import.meta.dirname, '../../..');

/** The realtime process as `npm start` runs it, to be killed. */
export class RealtimeProcess {
  private child: ChildProcess | undefined;
  private readonly bundle = path.join(root, '.cache', `realtime-under-test-${process.pid}.mjs`);

  private constructor(private readonly databaseUrl: string, readonly port: number) {}

  static async start(databaseUrl: string): Promise<RealtimeProcess> {
    const process_ = new RealtimeProcess(databaseUrl, await anyFreePort());
    mkdirSync(path.dirname(process_.bundle), { recursive: true });
    await build({
      absWorkingDir: root, entryPoints: ['realtime/server/main.ts'], outfile: process_.bundle, bundle: true, platform: 'node',
      target: 'node20', format: 'esm', packages: 'external', logLevel: 'warning',
    });
    await process_.launch();
    return process_;
  }

  async launch(): Promise<void> {
    this.child = spawn(process.execPath, [this.bundle], {
      stdio: ['ignore', 'inherit', 'inherit'],
      env: {
        PATH: process.env['PATH'], NODE_ENV: 'test', DATABASE_URL: this.databaseUrl, REALTIME_PORT: String(this.port), INTERNAL_SECRET: secret,
        PUBLIC_URL: pageOrigin, LOG_LEVEL: 'fatal',
      },
    });
    await waitFor('realtime to be ready', () => fetch(`http://127.0.0.1:${this.port}/ready`).then((answer) => answer.ok, () => false));
  }

  async end(signal: 'SIGKILL' | 'SIGTERM'): Promise<number | null> {
    const { child } = this;
    if (!child || child.exitCode !== null || child.signalCode !== null) return null;
    const ended = new Promise<number | null>((resolve) => child.once('exit', (code) => resolve(code)));
    child.kill(signal);
    return ended;
  }

  async stop(): Promise<void> {
    await this.end('SIGKILL');
    rmSync(this.bundle, { force: true });
  }
}
