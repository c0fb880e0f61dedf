import { DrizzleMySQLAdapter } from '@lucia-auth/adapter-drizzle';
import { Lucia, TimeSpan } from 'lucia';
import type { Database } from '@/db/client';
import { touchSession } from '@/db/mutations/sessions';
import { people, sessions } from '@/db/schema/people';
import type { Person } from '@/lib/access/caller';
import { mintPerson } from '@/lib/access/mint';
import { newToken, tokenHash } from './token';

const hour = 3_600_000;
/** A session unused for this long ends. */
export const idleLimit = 12 * hour;
/** A session ends after this long, whatever the use. */
export const absoluteLimit = 30 * 24 * hour;
/** How often a session's last use is written. */
const touchEvery = 5 * 60_000;

declare module 'lucia' {
  interface Register {
    Lucia: ReturnType<typeof luciaOn>;
    DatabaseSessionAttributes: { signedInAt: Date; endsAt: Date; lastUsedAt: Date; userAgent: string };
    DatabaseUserAttributes: { name: string; email: string };
  }
}

function luciaOn(db: Database) {
  return new Lucia(new DrizzleMySQLAdapter(db, sessions, people), {
    sessionExpiresIn: new TimeSpan(idleLimit / hour, 'h'),
    getSessionAttributes: ({ signedInAt, endsAt, lastUsedAt }) => ({ signedInAt, endsAt, lastUsedAt }),
    getUserAttributes: ({ name, email }) => ({ name, email }),
  });
}

const made = new WeakMap<Database, ReturnType<typeof luciaOn>>();
function lucia(db: Database) {
  const known = made.get(db) ?? luciaOn(db);
  made.set(db, known);
  return known;
}

/** Starts a session and answers the cookie's value; the table keeps only its SHA-256. */
export async function startSession(db: Database, personId: string, userAgent: string, now = new Date()): Promise<string> {
  const token = newToken();
  await lucia(db).createSession(personId, {
    signedInAt: now, lastUsedAt: now, endsAt: new Date(now.getTime() + absoluteLimit), userAgent: userAgent.slice(0, 200),
  }, { sessionId: tokenHash(token) });
  return token;
}

/** The person behind a cookie's value, or null when its session is unknown or past one of its limits. */
export async function personOfSession(db: Database, token: string, now = new Date()): Promise<Person | null> {
  if (!/^[A-Za-z0-9_-]{22}$/.test(token)) return null;
  const { session, user } = await lucia(db).validateSession(tokenHash(token));
  if (!session) return null;
  if (session.endsAt <= now) {
    await lucia(db).invalidateSession(session.id);
    return null;
  }
  if (now.getTime() - session.lastUsedAt.getTime() > touchEvery) {
    await touchSession(db, session.id, now, new Date(now.getTime() + idleLimit));
  }
  return { id: mintPerson(user.id), name: user.name, email: user.email, session: { id: session.id, signedInAt: session.signedInAt } };
}

export async function dropSession(db: Database, sessionId: string): Promise<void> {
  await lucia(db).invalidateSession(sessionId);
}
