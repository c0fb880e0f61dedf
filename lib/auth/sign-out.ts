import type { Database } from '@/db/client';
import { writeAudit } from '@/db/mutations/audit';
import type { Person } from '@/lib/access/caller';
import { dropSession } from './session';

/** Ends the session that a person acts in. */
export async function signOut(db: Database, person: Person, requestId: string): Promise<void> {
  await dropSession(db, person.session.id);
  await writeAudit(db, { bench: null, actor: person.id, action: 'signed out', requestId });
}
