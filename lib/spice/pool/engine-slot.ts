import { sentinelRawFile } from '../protocol/sentinel';
import type { OpenWorker, WorkerPort } from './worker-port';

/** How one run ended. */
export type SlotReply =
  | { readonly ending: 'done'; readonly raw: Uint8Array | null; readonly errors: readonly string[] }
  | { readonly ending: 'fatal' | 'timeout' | 'crash'; readonly errors: readonly string[] };

export interface SlotLimits {
  /** Longest time from opening a worker to its `ready`, ms. */
  readonly startMs: number;
  /** Runs after which a worker is replaced, because ngspice keeps a little of each (`docs/engine.md` 1.3, step 7). */
  readonly runsPerWorker: number;
}

const closedWords = 'the engine was closed';

type Listener = (reply: SlotReply | { readonly ending: 'ready' }) => void;

/**
 * One worker and its watchdog. A run blocks the worker's own event loop, so only this side can stop it. After a fatal
 * end, a timeout or a crash the worker is thrown away and the next run opens a new one.
 */
export class EngineSlot {
  #port: WorkerPort | null = null;
  #listener: Listener | null = null;
  #runs = 0;
  #jobs = 0;
  #starting: Promise<SlotReply | null> | null = null;
  #ended = false;

  constructor(private readonly open: OpenWorker, private readonly limits: SlotLimits) {}

  get ready(): boolean {
    return this.#port !== null && this.#starting === null;
  }

  /** Opens the worker if there is none. Answers the failure, null when it stands ready. */
  start(): Promise<SlotReply | null> {
    if (this.#starting !== null) return this.#starting;
    if (this.#ended) return Promise.resolve(crash(closedWords));
    if (this.#port !== null) return Promise.resolve(null);
    this.#starting = this.#openWorker().finally(() => { this.#starting = null; });
    return this.#starting;
  }

  /** Runs one deck; never rejects. The caller runs one at a time. */
  async run(deck: string, timeoutMs: number): Promise<SlotReply> {
    if (this.#runs >= this.limits.runsPerWorker) await this.#discard();
    const failure = await this.start();
    const port = this.#port;
    if (failure !== null || port === null) return failure ?? crash(closedWords);

    this.#runs += 1;
    this.#jobs += 1;
    const id = this.#jobs;
    const reply = await this.#await(timeoutMs, () => port.post({ id, deck, sentinel: sentinelRawFile() }));
    if (reply.ending === 'ready') return crash('the worker started twice');
    if (reply.ending !== 'done') await this.#discard();
    return reply;
  }

  /** Ends the worker for good; a run under way and every later one is refused. */
  async end(): Promise<void> {
    this.#ended = true;
    await this.#discard();
  }

  async #discard(): Promise<void> {
    const port = this.#port;
    this.#port = null;
    this.#runs = 0;
    this.#listener?.(crash(closedWords));
    await port?.terminate();
  }

  async #openWorker(): Promise<SlotReply | null> {
    const port = this.open();
    this.#port = port;
    port.listen({
      message: (message) => {
        if (this.#port !== port) return;
        if (message.type === 'failed') this.#listener?.(crash(message.words));
        else if (message.type === 'ready') this.#listener?.({ ending: 'ready' });
        else if (message.id !== this.#jobs) return;
        else if (message.type === 'fatal') this.#listener?.({ ending: 'fatal', errors: message.errors });
        else this.#listener?.({ ending: 'done', raw: message.raw, errors: message.errors });
      },
      failure: (words) => {
        if (this.#port === port) this.#listener?.(crash(words));
      },
    });
    const reply = await this.#await(this.limits.startMs, () => {});
    if (reply.ending === 'ready') return null;
    await this.#discard();
    return reply;
  }

  #await(timeoutMs: number, begin: () => void): Promise<SlotReply | { readonly ending: 'ready' }> {
    return new Promise((resolve) => {
      const port = this.#port;
      const finish: Listener = (reply) => {
        clearTimeout(watchdog);
        this.#listener = null;
        port?.hold(false);
        resolve(reply);
      };
      const watchdog = setTimeout(
        () => finish({ ending: 'timeout', errors: [`no answer within ${timeoutMs} ms`] }),
        timeoutMs,
      );
      this.#listener = finish;
      port?.hold(true);
      begin();
    });
  }
}

function crash(words: string): SlotReply {
  return { ending: 'crash', errors: [words] };
}
