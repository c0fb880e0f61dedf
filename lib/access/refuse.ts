import { Problem } from '@/lib/errors/problem';
import type { Person } from './caller';
import { may, type Standing } from './may';
import type { Action } from './rights';

/** Throws 403 unless the caller may do one of `actions`. */
export function refuseUnless(actions: readonly Action[], standing: Standing): void {
  if (actions.some((action) => may(action, standing))) return;
  const own = actions.includes('sign off') && standing.role === 'mentor' && standing.contributor === true;
  if (own) throw new Problem('contributor', 'Nobody signs off a revision that they made part of.');
  throw new Problem('not-allowed', reasonFor(actions, standing));
}

function reasonFor(actions: readonly Action[], standing: Standing): string {
  if (standing.role === 'guest') return 'A guest link lets you read, nothing else.';
  if (actions.includes('edit the sheet') || actions.includes('cut a revision') || actions.includes('ask for review')) {
    return 'Only the makers of this circuit can do this.';
  }
  if (actions.includes('sign off')) return 'Only a mentor signs off.';
  if (actions.includes('ask for changes')) return 'Only a mentor, or a reviewer named for this revision, asks for changes.';
  return `As a ${standing.role} of this bench you cannot do this.`;
}

const freshFor = 12 * 3_600_000;

/** Acts that bind want a session signed in at most 12 h ago. */
export function refuseStaleSession(person: Person, now = new Date()): void {
  if (now.getTime() - person.session.signedInAt.getTime() > freshFor) throw new Problem('sign-in-again');
}
