import { Problem } from '@/lib/errors/problem';

interface Bucket { tokens: number; at: number }

/**
 * Token buckets by key in this process's memory: `perMinute` on average, as many at once. Keys unused for two minutes
 * are forgotten, so memory follows the number of active people.
 */
export class RateLimit {
  private readonly buckets = new Map<string, Bucket>();
  private swept = 0;

  constructor(private readonly perMinute: number) {}

  /** Takes one call; throws `too-many` with the seconds after which the next one passes. */
  take(key: string, now = Date.now()): void {
    this.sweep(now);
    const bucket = this.buckets.get(key) ?? { tokens: this.perMinute, at: now };
    const tokens = Math.min(this.perMinute, bucket.tokens + ((now - bucket.at) / 60_000) * this.perMinute);
    if (tokens < 1) {
      const retryAfter = Math.max(1, Math.ceil(((1 - tokens) / this.perMinute) * 60));
      throw new Problem('too-many', `At most ${this.perMinute} of these a minute.`, { retryAfter });
    }
    this.buckets.set(key, { tokens: tokens - 1, at: now });
  }

  private sweep(now: number): void {
    if (now - this.swept < 60_000) return;
    this.swept = now;
    for (const [key, bucket] of this.buckets) if (now - bucket.at > 120_000) this.buckets.delete(key);
  }
}

/** Counts what is running for each key. */
export class Concurrency {
  private readonly running = new Map<string, number>();

  constructor(private readonly most: number) {}

  async run<T>(key: string, work: () => Promise<T>): Promise<T> {
    const running = this.running.get(key) ?? 0;
    if (running >= this.most) throw new Problem('too-many', `At most ${this.most} checks at once.`, { retryAfter: 1 });
    this.running.set(key, running + 1);
    try {
      return await work();
    } finally {
      const left = (this.running.get(key) ?? 1) - 1;
      if (left > 0) this.running.set(key, left);
      else this.running.delete(key);
    }
  }
}
