import { and, eq, gt } from 'drizzle-orm';
import type { PersonId } from '../authorized';
import type { Executor } from '../client';
import { sessions } from '../schema/people';

/** A person's sessions in force, oldest first. */
export async function ownSessions(db: Executor, person: PersonId, now: Date) {
  return db.select({ id: sessions.id, signedInAt: sessions.signedInAt, lastUsedAt: sessions.lastUsedAt, userAgent: sessions.userAgent })
    .from(sessions).where(and(eq(sessions.userId, person), gt(sessions.expiresAt, now), gt(sessions.endsAt, now)))
    .orderBy(sessions.signedInAt);
}
