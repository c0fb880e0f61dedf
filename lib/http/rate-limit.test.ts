import { describe, expect, it } from 'vitest';
import { Concurrency, RateLimit } from './rate-limit';

describe('RateLimit', () => {
  it('passes 30 in a minute, refuses the 31st with the seconds to wait, and passes again after them', () => {
    const limit = new RateLimit(30);
    for (let call = 0; call < 30; call += 1) limit.take('a', 1_000);
    expect(() => limit.take('a', 1_000)).toThrowError(expect.objectContaining({ code: 'too-many', members: { retryAfter: 2 } }));
    expect(() => limit.take('b', 1_000)).not.toThrow();
    expect(() => limit.take('a', 3_000)).not.toThrow();
    expect(() => limit.take('a', 3_000)).toThrow();
  });

  it('forgets nobody who is still waiting', () => {
    const limit = new RateLimit(1);
    limit.take('a', 0);
    expect(() => limit.take('a', 59_000)).toThrow();
    expect(() => limit.take('a', 61_000)).not.toThrow();
  });
});

describe('Concurrency', () => {
  it('lets two run at once and a third after one has ended, also when it failed', async () => {
    const two = new Concurrency(2);
    let fail!: (error: Error) => void;
    const first = two.run('a', () => new Promise((_, reject) => { fail = reject; }));
    const second = two.run('a', () => new Promise(() => undefined));
    await expect(two.run('a', async () => 1)).rejects.toMatchObject({ code: 'too-many' });
    await expect(two.run('b', async () => 1)).resolves.toBe(1);
    fail(new Error('ended'));
    await expect(first).rejects.toThrow('ended');
    await expect(two.run('a', async () => 1)).resolves.toBe(1);
    void second;
  });
});
