import { createHash } from 'node:crypto';
import { setTimeout as pause } from 'node:timers/promises';
import { ulid } from 'ulid';
import type { Database } from '@/db/client';
import { claimKey, letGoOfKey, releaseKey, storeAnswer, takeUpKey, type FirstAnswer } from '@/db/mutations/idempotency';
import { statusOf } from '@/lib/errors/codes';
import { Problem } from '@/lib/errors/problem';
import { logger } from '@/lib/log/logger';
import type { Answer } from './answer';

/** A request that has not ended after this long was cut off by a crash: a repeat takes it up. */
const abandonedAfter = 60_000;
/** How long a repeat waits for the first request to end, and how often it looks. */
const patience = 10_000;
const lookEvery = 50;

/** Runs the request; `thing` is the id of what it makes, the same one for every time that it is taken up. */
type Work = (thing?: string) => Promise<Answer>;

/**
 * Runs a write once for each `Idempotency-Key` of a person: a repeat waits for the first one and answers 200 with its body, the
 * same key for another request is refused, a refused request leaves the key free. A request cut off between its commit and its
 * stored answer is taken up under the same id, finds what was made and answers that.
 */
export async function once(db: Database, personId: string, key: string | null, request: readonly unknown[], work: Work): Promise<Answer> {
  if (key === null) return work();
  if (!/^[\x21-\x7e]{1,100}$/.test(key)) throw new Problem('input-wrong', 'An idempotency key has 1 to 100 visible ASCII characters.');
  const requestHash = createHash('sha256').update(JSON.stringify(request)).digest('hex');
  const thingId = ulid();
  for (const until = Date.now() + patience; ;) {
    const now = new Date();
    const first = await claimKey(db, personId, key, { requestHash, thingId, createdAt: now });
    if (!first) return run(db, personId, key, thingId, work);
    if (first.requestHash !== requestHash) throw new Problem('key-reused');
    if (first.done) return again(first);
    const abandoned = now.getTime() - first.createdAt.getTime() > abandonedAfter;
    if (abandoned && await takeUpKey(db, personId, key, first.createdAt, now)) return run(db, personId, key, first.thingId ?? thingId, work);
    if (Date.now() > until) throw new Problem('busy', 'The first request with this key is still running.', { retryAfter: 1 });
    await pause(lookEvery);
  }
}

const again = ({ answer }: FirstAnswer): Answer => ({ status: answer === null || Object.keys(answer).length === 0 ? 204 : 200, body: answer });

async function run(db: Database, personId: string, key: string, thing: string, work: Work): Promise<Answer> {
  const letGo = () => letGoOfKey(db, personId, key, new Date(Date.now() - abandonedAfter - 1_000))
    .catch((error: unknown) => logger('http').warn({ err: error }, 'an idempotency key stays claimed for a minute'));
  let answer: Answer;
  try {
    answer = await work(thing);
  } catch (error) {
    if (error instanceof Problem && statusOf(error.code) < 500) await releaseKey(db, personId, key);
    else await letGo();
    throw error;
  }
  // The thing is made: whoever asks hears so, also when the answer cannot be kept for a repeat.
  await storeAnswer(db, personId, key, answer.status, (answer.body ?? {}) as Record<string, unknown>).catch(letGo);
  return answer;
}
