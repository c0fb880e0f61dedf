import { eq, lt, sql } from 'drizzle-orm';
import type { Executor } from '../client';
import { signInDelays } from '../schema/people';

export async function signInDelay(db: Executor, id: string) {
  const [row] = await db.select({ failures: signInDelays.failures, waitUntil: signInDelays.waitUntil, lastAt: signInDelays.lastAt })
    .from(signInDelays).where(eq(signInDelays.id, id));
  return row;
}

/** Counts one more failure in SQL, so that failures at once all count. */
export async function countFailure(db: Executor, id: string, now: Date): Promise<number> {
  await db.insert(signInDelays).values({ id, failures: 1, waitUntil: now, lastAt: now })
    .onDuplicateKeyUpdate({ set: { failures: sql`${signInDelays.failures} + 1`, lastAt: now } });
  return (await signInDelay(db, id))?.failures ?? 1;
}

export async function setWait(db: Executor, id: string, waitUntil: Date): Promise<void> {
  await db.update(signInDelays).set({ waitUntil }).where(eq(signInDelays.id, id));
}

export async function clearFailures(db: Executor, id: string): Promise<void> {
  await db.delete(signInDelays).where(eq(signInDelays.id, id));
}

export async function forgetOldFailures(db: Executor, before: Date): Promise<void> {
  await db.delete(signInDelays).where(lt(signInDelays.lastAt, before));
}
