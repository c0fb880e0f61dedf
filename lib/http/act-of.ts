import type { Database } from '@/db/client';
import type { Person } from '@/lib/access/caller';
import type { Act } from '@/lib/review/act';

/** Who acts, from a call: what use cases take. */
export const actOf = ({ db, person, requestId }: { readonly db: Database; readonly person: Person; readonly requestId: string }): Act => (
  { db, person, requestId, now: new Date() }
);
