import { createHash } from 'node:crypto';
import type { Executor } from '@/db/client';
import { clearFailures, countFailure, setWait, signInDelay } from '@/db/mutations/sign-in-delays';
import { Problem } from '@/lib/errors/problem';

/** Wrong passwords that cost nothing: everybody mistypes. */
const free = 4;
const longest = 15 * 60;
/** Failures older than this are forgotten. */
const memory = 24 * 3_600_000;

/** Seconds to wait after the n-th wrong password in a row: 0 up to the fourth, then 1, 2, 4 … up to a quarter of an hour. */
export function waitAfter(failures: number): number {
  return failures <= free ? 0 : Math.min(2 ** (failures - free - 1), longest);
}

/** Account and address together: a stranger's wrong passwords never slow down the account's owner elsewhere. */
export function delayKey(email: string, address: string): string {
  return createHash('sha256').update(JSON.stringify([email, address])).digest('hex');
}

/** Refuses with 429 while a wait is running, whether or not the account exists. */
export async function refuseWhileWaiting(db: Executor, key: string, now: Date): Promise<void> {
  const row = await signInDelay(db, key);
  if (!row || row.waitUntil <= now) return;
  const seconds = Math.ceil((row.waitUntil.getTime() - now.getTime()) / 1_000);
  throw new Problem('too-many', `Too many wrong passwords for this address: wait ${seconds} s.`, { retryAfter: seconds });
}

export async function noteFailure(db: Executor, key: string, now: Date): Promise<void> {
  const before = await signInDelay(db, key);
  if (before && now.getTime() - before.lastAt.getTime() > memory) await clearFailures(db, key);
  const wait = waitAfter(await countFailure(db, key, now));
  if (wait > 0) await setWait(db, key, new Date(now.getTime() + wait * 1_000));
}

export const forgiveFailures = clearFailures;
