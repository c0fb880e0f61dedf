import { spawn } from 'node:child_process';
import { closeSync, existsSync, openSync, readFileSync, renameSync, statSync } from 'node:fs';
import { processIdentity } from '../machine/processes.mjs';
import { say, words } from '../machine/say.mjs';
import { waitUntil } from '../machine/wait-until.mjs';

const firstDelayMs = 250;
const longestDelayMs = 15_000;
/** A part that lived this long starts over with the short delay. */
const settledMs = 60_000;
const largestLog = 5 * 1024 * 1024;

/**
 * @typedef {object} PartPlan
 * @property {string} name
 * @property {string} command
 * @property {readonly string[]} args
 * @property {NodeJS.ProcessEnv} env
 * @property {string} [cwd]
 * @property {string} logFile
 * @property {() => Promise<boolean> | boolean} ready asked until it is true
 * @property {() => Promise<void>} [before] run before each start
 * @property {number} [readyMs] how long getting ready may take (60 s)
 * @property {number} [graceMs] from SIGTERM to SIGKILL (10 s)
 * @property {boolean} [echo] also print its output here (development)
 */

/** One supervised child process: started, watched, started again when it dies, and stopped for good once. */
export class Part {
  /** @type {import('node:child_process').ChildProcess | undefined} */
  #child;
  /** @type {Promise<void>} */
  #exited = Promise.resolve();
  #stopping = new AbortController();
  #delayMs = firstDelayMs;
  /** @type {(part: Part) => void} */
  #changed;

  /** @param {PartPlan} plan @param {(part: Part) => void} [changed] called when the process behind the part is another one */
  constructor(plan, changed = () => {}) {
    this.plan = plan;
    this.#changed = changed;
  }

  /** The running process, as the lock records it. */
  get holder() {
    const pid = this.#child?.pid;
    return pid === undefined ? undefined : { name: this.plan.name, pid, identity: processIdentity(pid) };
  }

  /** Starts the part and waits until it is ready. Rejects with its last lines when it is not in time. */
  async start() {
    const { name, ready, readyMs = 60_000 } = this.plan;
    await this.#spawn();
    let died = false;
    const first = this.#exited.then(() => { died = true; });
    const answered = await waitUntil(async () => !died && (await ready()), { timeoutMs: readyMs, signal: this.#stopping.signal, everyMs: 50, until: () => died });
    if (answered || this.#stopping.signal.aborted) {
      first.then(() => this.#restart());
      return;
    }
    throw new Error(`${name} ${died ? 'ended while starting' : 'did not get ready'}.\n${this.lastLines()}`);
  }

  async #spawn() {
    const { command, args, env, cwd, logFile, before, echo } = this.plan;
    await before?.();
    if (this.#stopping.signal.aborted) return;
    if (existsSync(logFile) && statSync(logFile).size > largestLog) renameSync(logFile, `${logFile}.1`);
    const log = openSync(logFile, 'a', 0o600);
    // A group of its own: Ctrl-C at the terminal reaches the supervisor alone, which stops the parts in order.
    const child = spawn(command, args, { env: { ...env, HOLDOFF_SUPERVISOR: String(process.pid) }, cwd, detached: true, stdio: ['pipe', echo ? 'inherit' : log, echo ? 'inherit' : log] });
    closeSync(log);
    child.stdin?.on('error', () => {});
    this.#child = child;
    this.#exited = new Promise((resolve) => {
      child.once('exit', () => resolve());
      child.once('error', () => resolve());
    });
    this.#changed(this);
  }

  async #restart() {
    for (;;) {
      if (this.#stopping.signal.aborted) return;
      say(`${this.plan.name} ended unexpectedly; starting it again`);
      const startedAt = Date.now();
      await waitUntil(() => false, { timeoutMs: this.#delayMs, signal: this.#stopping.signal });
      this.#delayMs = Math.min(this.#delayMs * 2, longestDelayMs);
      try {
        await this.#spawn();
      } catch (error) {
        say(`${this.plan.name}: ${words(error)}`);
        continue;
      }
      await this.#exited;
      if (Date.now() - startedAt > settledMs) this.#delayMs = firstDelayMs;
    }
  }

  /** Ends the part within its grace and keeps it ended. */
  async stop() {
    this.#stopping.abort();
    const child = this.#child;
    if (!child || child.exitCode !== null || child.signalCode !== null) return;
    child.kill('SIGTERM');
    const timer = setTimeout(() => this.#killGroup(), this.plan.graceMs ?? 10_000);
    await this.#exited;
    clearTimeout(timer);
    this.#killGroup();
  }

  #killGroup() {
    const pid = this.#child?.pid;
    if (pid === undefined) return;
    try {
      process.kill(-pid, 'SIGKILL');
    } catch {
      // The group is gone already.
    }
  }

  lastLines() {
    try {
      return `Last lines of ${this.plan.logFile}:\n${readFileSync(this.plan.logFile, 'utf8').trim().split('\n').slice(-12).join('\n')}`;
    } catch {
      return '';
    }
  }
}
