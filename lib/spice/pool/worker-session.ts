import { sentinelRawFile } from '../protocol/sentinel';
import type { OpenWorker, WorkerPort } from './worker-port';

/** How one run ended. */
export type RunEnding =
  | { readonly ending: 'done'; readonly raw: Uint8Array | null; readonly errors: readonly string[] }
  | { readonly ending: 'fatal' | 'timeout' | 'crash'; readonly errors: readonly string[] };

type Heard = RunEnding | { readonly ending: 'ready' };

/** One worker from its start to its end, with the watchdog: a run blocks the worker's own event loop, so only this side can stop it. */
export class WorkerSession {
  readonly #port: WorkerPort;
  readonly #startMs: number;
  #heard: ((event: Heard) => void) | null = null;
  #started: Promise<RunEnding | null> | null = null;
  #state: 'starting' | 'ready' | 'ended' = 'starting';
  #runs = 0;

  constructor(open: OpenWorker, startMs: number) {
    this.#startMs = startMs;
    this.#port = open();
    this.#port.listen({
      message: (message) => {
        if (message.type === 'failed') this.#heard?.(crash(message.words));
        else if (message.type === 'ready') this.#heard?.({ ending: 'ready' });
        else if (message.id !== this.#runs) return;
        else if (message.type === 'fatal') this.#heard?.({ ending: 'fatal', errors: message.errors });
        else this.#heard?.({ ending: 'done', raw: message.raw, errors: message.errors });
      },
      failure: (words) => {
        if (this.#heard === null) void this.end();
        else this.#heard(crash(words));
      },
    });
  }

  get ready(): boolean {
    return this.#state === 'ready';
  }

  get ended(): boolean {
    return this.#state === 'ended';
  }

  /** Runs begun so far. */
  get runs(): number {
    return this.#runs;
  }

  /** Waits for the worker. Answers the failure, null when it stands ready. */
  start(): Promise<RunEnding | null> {
    this.#started ??= this.#hear(this.#startMs, () => {}).then(async (event) => {
      if (event.ending !== 'ready') {
        await this.end();
        return event;
      }
      this.#state = 'ready';
      return null;
    });
    return this.#started;
  }

  /** Runs one deck, one at a time; never rejects. Whatever ends otherwise than done ends the worker. */
  async run(deck: string, timeoutMs: number): Promise<RunEnding> {
    if (this.#state !== 'ready') return crash(closedWords);
    this.#runs += 1;
    const event = await this.#hear(timeoutMs, () => this.#port.post({ id: this.#runs, deck, sentinel: sentinelRawFile() }));
    const ending = event.ending === 'ready' ? crash('the worker started twice') : event;
    if (ending.ending !== 'done') await this.end();
    return ending;
  }

  async end(): Promise<void> {
    if (this.#state === 'ended') return;
    this.#state = 'ended';
    this.#heard?.(crash(closedWords));
    await this.#port.terminate();
  }

  #hear(timeoutMs: number, begin: () => void): Promise<Heard> {
    return new Promise((resolve) => {
      const finish = (event: Heard): void => {
        clearTimeout(watchdog);
        this.#heard = null;
        this.#port.hold(false);
        resolve(event);
      };
      const watchdog = setTimeout(() => finish({ ending: 'timeout', errors: [`no answer within ${timeoutMs} ms`] }), timeoutMs);
      this.#heard = finish;
      this.#port.hold(true);
      begin();
    });
  }
}

const closedWords = 'the engine was closed';

export function crash(words: string = closedWords): RunEnding {
  return { ending: 'crash', errors: [words] };
}
