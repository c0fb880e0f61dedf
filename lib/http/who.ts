import type { Database } from '@/db/client';
import { guestLinkByHash } from '@/db/queries/standing';
import type { Caller } from '@/lib/access/caller';
import { personOfSession } from '@/lib/auth/session';
import { tokenHash } from '@/lib/auth/token';
import { guestTokenSchema } from '@/lib/schemas/guest-link';
import { readCookie } from './cookies';

/** Who a `Cookie` header stands for. Fails closed: what is unknown, ended or malformed counts as nobody. */
export async function callerOf(db: Database, cookieHeader: string | null, secure: boolean): Promise<Caller> {
  const session = readCookie(cookieHeader, 'session', secure);
  const guest = readCookie(cookieHeader, 'guest', secure);
  const [person, link] = await Promise.all([
    session === null ? null : personOfSession(db, session),
    guest !== null && guestTokenSchema.safeParse(guest).success ? guestLinkByHash(db, tokenHash(guest)) : undefined,
  ]);
  return { person, link: link ?? null };
}
