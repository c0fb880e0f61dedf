import type { Database } from '@/db/client';
import { writeAudit } from '@/db/mutations/audit';
import { endOtherSessions, endSession } from '@/db/mutations/sessions';
import { ownSessions } from '@/db/queries/sessions';
import type { Person } from '@/lib/access/caller';
import { Problem } from '@/lib/errors/problem';
import type { OwnSession } from '@/lib/schemas/session';

/** A person's sessions in force, oldest first. */
export async function listOwnSessions(db: Database, person: Person, now = new Date()): Promise<OwnSession[]> {
  return (await ownSessions(db, person.id, now)).map((row) => ({
    id: row.id, signedInAt: row.signedInAt.toISOString(), lastUsedAt: row.lastUsedAt.toISOString(), userAgent: row.userAgent,
    current: row.id === person.session.id,
  }));
}

/** Ends one of a person's sessions, or all but the one they act in; answers the ids that ended. */
export async function endOwnSessions(db: Database, person: Person, id: string | undefined, requestId: string): Promise<readonly string[]> {
  if (id !== undefined && !await endSession(db, person.id, id)) throw new Problem('not-found');
  const ended = id === undefined ? await endOtherSessions(db, person.id, person.session.id) : [id];
  await writeAudit(db, { bench: null, actor: person.id, action: 'ended sessions', detail: { count: ended.length }, requestId });
  return ended;
}
