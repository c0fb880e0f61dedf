import { createHash } from 'node:crypto';
import type { Database } from '@/db/client';
import { claimKey, releaseKey, storeAnswer } from '@/db/mutations/idempotency';
import { Problem } from '@/lib/errors/problem';
import type { Answer } from './answer';

/** A request that has not ended after this long was cut off by a crash: its key may be used again. */
const abandonedAfter = 60_000;

/**
 * Runs a write once for each `Idempotency-Key` of a person: a repeat answers 200 with the first one's body, the same key for
 * another request is refused, a refused request leaves the key free.
 */
export async function once(
  db: Database, personId: string, key: string | null, request: readonly unknown[], work: () => Promise<Answer>, now = new Date(),
): Promise<Answer> {
  if (key === null) return work();
  if (!/^[\x21-\x7e]{1,100}$/.test(key)) throw new Problem('input-wrong', 'An idempotency key has 1 to 100 visible ASCII characters.');
  const hash = createHash('sha256').update(JSON.stringify(request)).digest('hex');
  let first = await claimKey(db, personId, key, hash, now);
  if (first && !first.done && now.getTime() - first.createdAt.getTime() > abandonedAfter) {
    await releaseKey(db, personId, key);
    first = await claimKey(db, personId, key, hash, now);
  }
  if (first) {
    if (first.requestHash !== hash) throw new Problem('key-reused');
    if (!first.done) throw new Problem('busy', 'The first request with this key is still running.', { retryAfter: 1 });
    return { status: first.answer === null || Object.keys(first.answer).length === 0 ? 204 : 200, body: first.answer };
  }
  try {
    const answer = await work();
    await storeAnswer(db, personId, key, answer.status, (answer.body ?? {}) as Record<string, unknown>);
    return answer;
  } catch (error) {
    await releaseKey(db, personId, key);
    throw error;
  }
}
