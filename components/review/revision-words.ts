import { voltsWords } from '@/components/ladder/plan-words';
import { signedTo, stands } from '@/components/circuit/signed-state';
import type { Revision, RevisionState, SignOff } from '@/lib/schemas/revision';

export const stateWords: Readonly<Record<RevisionState, string>> = {
  cut: 'Cut, not in review yet',
  'in review': 'In review',
  'changes asked': 'Changes asked',
  'signed off': 'Signed off',
  superseded: 'Superseded',
  withdrawn: 'Sign-off withdrawn',
};

/** State of a revision and how far it is signed. */
export function revisionWords(revision: Revision, now: Date): string {
  const to = signedTo(revision, now);
  return to ? `Signed off to ${voltsWords(to.volts)}` : stateWords[revision.state];
}

/** Why a sign-off no longer counts; null while it does. */
export function voidWords(signOff: SignOff, now: Date): string | null {
  if (stands(signOff, now)) return null;
  return signOff.withdrawnAt ? 'withdrawn' : 'past its date';
}

/** A hash in groups of four, as it is read aloud; `groups` of them. */
export function hashWords(hash: string, groups = 4): string {
  return (hash.slice(0, groups * 4).match(/.{1,4}/gu) ?? []).join(' ');
}

/** A hash for a tight place: its first and last four. */
export function shortHash(hash: string): string {
  return `${hash.slice(0, 4)}…${hash.slice(-4)}`;
}
