import type { Database } from '@/db/client';
import type { Person } from '@/lib/access/caller';
import type { Act } from '@/lib/review/act';

/** Who acts, from a call: what use cases take. */
export const actOf = ({ db, person, requestId, thing }: { readonly db: Database; readonly person: Person; readonly requestId: string; readonly thing: string | undefined }): Act => (
  { db, person, requestId, thing, now: new Date() }
);
