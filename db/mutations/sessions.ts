import { and, eq, lte, ne, or } from 'drizzle-orm';
import type { PersonId } from '../authorized';
import type { Executor } from '../client';
import { sessions } from '../schema/people';

/** Notes that a session was used and moves its idle limit on. */
export async function touchSession(db: Executor, id: string, now: Date, expiresAt: Date): Promise<void> {
  await db.update(sessions).set({ lastUsedAt: now, expiresAt }).where(eq(sessions.id, id));
}

/** Ends one of a person's sessions; false when it is none of theirs. */
export async function endSession(db: Executor, person: PersonId, id: string): Promise<boolean> {
  const [result] = await db.delete(sessions).where(and(eq(sessions.userId, person), eq(sessions.id, id)));
  return result.affectedRows > 0;
}

/** Ends every session of a person but one, and answers the ids it ended. */
export async function endOtherSessions(db: Executor, person: PersonId, keep: string): Promise<string[]> {
  const others = and(eq(sessions.userId, person), ne(sessions.id, keep));
  const ended = await db.select({ id: sessions.id }).from(sessions).where(others);
  await db.delete(sessions).where(others);
  return ended.map((row) => row.id);
}

export async function forgetEndedSessions(db: Executor, now: Date): Promise<void> {
  await db.delete(sessions).where(or(lte(sessions.expiresAt, now), lte(sessions.endsAt, now)));
}
