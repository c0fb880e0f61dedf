import { and, eq, lt, or } from 'drizzle-orm';
import type { Executor } from '../client';
import { isDuplicate } from '../errors';
import { idempotency } from '../schema/audit';

export interface FirstAnswer { readonly requestHash: string; readonly done: boolean; readonly answer: Record<string, unknown> | null; readonly createdAt: Date }

/** Claims a key for a request that starts now; answers what is stored when it was claimed before. */
export async function claimKey(db: Executor, personId: string, key: string, requestHash: string, now: Date): Promise<FirstAnswer | undefined> {
  try {
    await db.insert(idempotency).values({ personId, key, requestHash, createdAt: now });
    return undefined;
  } catch (error) {
    if (!isDuplicate(error)) throw error;
    const [row] = await db.select().from(idempotency).where(and(eq(idempotency.personId, personId), eq(idempotency.key, key)));
    return row;
  }
}

export async function storeAnswer(db: Executor, personId: string, key: string, status: number, answer: Record<string, unknown>): Promise<void> {
  await db.update(idempotency).set({ done: true, status, answer }).where(and(eq(idempotency.personId, personId), eq(idempotency.key, key)));
}

/** Gives a key back: its request was refused, or never ended. */
export async function releaseKey(db: Executor, personId: string, key: string): Promise<void> {
  await db.delete(idempotency).where(and(eq(idempotency.personId, personId), eq(idempotency.key, key)));
}

export async function forgetOldKeys(db: Executor, before: Date, unfinishedBefore: Date): Promise<void> {
  await db.delete(idempotency).where(or(
    lt(idempotency.createdAt, before),
    and(eq(idempotency.done, false), lt(idempotency.createdAt, unfinishedBefore)),
  ));
}
