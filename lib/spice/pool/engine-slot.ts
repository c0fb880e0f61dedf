import { crash, WorkerSession, type RunEnding } from './worker-session';
import type { OpenWorker } from './worker-port';

export interface SlotLimits {
  /** Longest time from opening a worker to its `ready`, ms. */
  readonly startMs: number;
  /** Runs after which a worker is replaced, because ngspice keeps a little of each (`docs/engine.md` 1.3, step 7). */
  readonly runsPerWorker: number;
}

/**
 * A place for one worker. A worker that ended is replaced by the next run; one that has run its share is replaced by a
 * spare that starts beside it, so that nobody waits for the change.
 */
export class EngineSlot {
  #current: WorkerSession | null = null;
  #spare: WorkerSession | null = null;
  #ended = false;

  constructor(private readonly open: OpenWorker, private readonly limits: SlotLimits) {}

  get ready(): boolean {
    return this.#current?.ready === true || this.#spare?.ready === true;
  }

  /** Opens a worker if there is none. Answers the failure, null when one stands ready. */
  async start(): Promise<RunEnding | null> {
    if (this.#ended) return crash();
    this.#changeOver();
    this.#current ??= new WorkerSession(this.open, this.limits.startMs);
    return this.#current.start();
  }

  /** Runs one deck; never rejects. The caller runs one at a time. */
  async run(deck: string, timeoutMs: number): Promise<RunEnding> {
    const failure = await this.start();
    if (failure !== null) return failure;
    const ending = await (this.#current?.run(deck, timeoutMs) ?? crash());
    if ((this.#current?.runs ?? 0) >= this.limits.runsPerWorker) this.#openSpare();
    return ending;
  }

  /** Ends the worker for good; a run under way and every later one is refused. */
  async end(): Promise<void> {
    this.#ended = true;
    await Promise.all([this.#current?.end(), this.#spare?.end()]);
  }

  #openSpare(): void {
    if (this.#ended || (this.#spare !== null && !this.#spare.ended)) return;
    this.#spare = new WorkerSession(this.open, this.limits.startMs);
    void this.#spare.start();
  }

  /** Puts the spare in the place of a worker that ended, or of one that has run its share once the spare is ready. */
  #changeOver(): void {
    if (this.#spare?.ended) this.#spare = null;
    if (this.#current?.ended) this.#current = null;
    if (this.#spare === null || (this.#current !== null && !this.#spare.ready)) return;
    void this.#current?.end();
    this.#current = this.#spare;
    this.#spare = null;
  }
}
