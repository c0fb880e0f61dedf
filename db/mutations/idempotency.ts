import { and, eq, lt } from 'drizzle-orm';
import type { Executor } from '../client';
import { isDuplicate } from '../errors';
import { idempotency } from '../schema/audit';

export interface FirstAnswer {
  readonly requestHash: string;
  readonly thingId: string | null;
  readonly done: boolean;
  readonly answer: Record<string, unknown> | null;
  readonly createdAt: Date;
}

const ofKey = (personId: string, key: string) => and(eq(idempotency.personId, personId), eq(idempotency.key, key));

/** Claims a key for a request that starts now; answers what is stored when it was claimed before. */
export async function claimKey(db: Executor, personId: string, key: string, claim: { requestHash: string; thingId: string; createdAt: Date }): Promise<FirstAnswer | undefined> {
  try {
    await db.insert(idempotency).values({ personId, key, ...claim });
    return undefined;
  } catch (error) {
    if (!isDuplicate(error)) throw error;
    const [row] = await db.select().from(idempotency).where(ofKey(personId, key));
    return row;
  }
}

/** Takes up a request that was cut off; false when another repeat was quicker. */
export async function takeUpKey(db: Executor, personId: string, key: string, claimedAt: Date, now: Date): Promise<boolean> {
  const [result] = await db.update(idempotency).set({ createdAt: now })
    .where(and(ofKey(personId, key), eq(idempotency.done, false), eq(idempotency.createdAt, claimedAt)));
  return result.affectedRows > 0;
}

export async function storeAnswer(db: Executor, personId: string, key: string, status: number, answer: Record<string, unknown>): Promise<void> {
  await db.update(idempotency).set({ done: true, status, answer }).where(ofKey(personId, key));
}

/** Lets a repeat take up a request at once: it ended without saying whether anything was made. `claimedAt` lies far enough back. */
export async function letGoOfKey(db: Executor, personId: string, key: string, claimedAt: Date): Promise<void> {
  await db.update(idempotency).set({ createdAt: claimedAt }).where(ofKey(personId, key));
}

/** Gives a key back: its request was refused and made nothing. */
export async function releaseKey(db: Executor, personId: string, key: string): Promise<void> {
  await db.delete(idempotency).where(ofKey(personId, key));
}

export async function forgetOldKeys(db: Executor, before: Date): Promise<void> {
  await db.delete(idempotency).where(lt(idempotency.createdAt, before));
}
