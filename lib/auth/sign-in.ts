import type { PersonId } from '@/db/authorized';
import type { Database } from '@/db/client';
import { writeAudit } from '@/db/mutations/audit';
import { accountByEmail } from '@/db/queries/people';
import { mintPerson } from '@/lib/access/mint';
import { Problem } from '@/lib/errors/problem';
import type { SignIn } from '@/lib/schemas/session';
import { passwordMatches } from './password';
import { startSession } from './session';
import { delayKey, forgiveFailures, noteFailure, refuseWhileWaiting } from './sign-in-delay';

export interface SignInContext {
  /** The client's network address, as far as it is known. */
  readonly address: string;
  readonly userAgent: string;
  readonly requestId: string;
}

/**
 * Signs a person in and answers the new session's cookie value with whose it is. An unknown address and a wrong password answer alike and
 * take alike. Throws `sign-in-failed`, or `too-many` while a wait after wrong passwords is running.
 */
export async function signIn(db: Database, input: SignIn, context: SignInContext, now = new Date()): Promise<{ readonly token: string; readonly personId: PersonId }> {
  const key = delayKey(input.email, context.address);
  await refuseWhileWaiting(db, key, now);
  const account = await accountByEmail(db, input.email);
  if (!await passwordMatches(account?.passwordHash, input.password) || !account) {
    await noteFailure(db, key, now);
    throw new Problem('sign-in-failed');
  }
  await forgiveFailures(db, key);
  const token = await startSession(db, account.id, context.userAgent, now);
  await writeAudit(db, { bench: null, actor: account.id, action: 'signed in', requestId: context.requestId });
  return { token, personId: mintPerson(account.id) };
}
