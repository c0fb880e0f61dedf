import { Concurrency, RateLimit } from './rate-limit';

/** One set for the process, also when a bundler loads this module once for each route. */
interface Limits {
  readonly person: RateLimit;
  readonly stranger: RateLimit;
  readonly engine: RateLimit;
  readonly atOnce: Concurrency;
}

const shared = globalThis as typeof globalThis & { holdoffLimits?: Limits };

export function limits(): Limits {
  shared.holdoffLimits ??= {
    /** Plain calls of a person; people are promised 300. */
    person: new RateLimit(600),
    /** Calls without a session, by network address, behind which a whole class may sit. */
    stranger: new RateLimit(1_200),
    /** Calls that run the engine, by person. */
    engine: new RateLimit(30),
    atOnce: new Concurrency(2),
  };
  return shared.holdoffLimits;
}
