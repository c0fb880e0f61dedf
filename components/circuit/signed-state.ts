import type { LadderSigned } from '@/components/ladder/ladder-state';
import { voltsWords } from '@/components/ladder/plan-words';
import type { Revision, SignOff } from '@/lib/schemas/revision';

/** True while a sign-off counts: not withdrawn and not past its date. */
export function stands(signOff: SignOff, now: Date): boolean {
  return signOff.withdrawnAt === undefined && new Date(signOff.until) > now;
}

function highest(revision: Revision, signOffs: readonly SignOff[]): { readonly volts: number; readonly signOff: SignOff } | null {
  let best: { readonly volts: number; readonly signOff: SignOff } | null = null;
  for (const signOff of signOffs) {
    const volts = revision.holdPoints.find((point) => point.name === signOff.holdPoint)?.volts;
    if (volts !== undefined && (best === null || volts > best.volts)) best = { volts, signOff };
  }
  return best;
}

/** Highest standing sign-off of a revision. */
export function signedTo(revision: Revision, now: Date): { readonly volts: number; readonly signOff: SignOff } | null {
  return highest(revision, revision.signOffs.filter((signOff) => stands(signOff, now)));
}

/**
 * How far what is on show is signed. `onShow` is a letter, or null for the sheet; `moved` says whether the sheet has changed
 * electrically since its newest revision. A sign-off stays with its revision: it is never shown as covering anything else.
 */
export function signedState(revisions: readonly Revision[], onShow: string | null, moved: boolean, now: Date): LadderSigned {
  const newest = revisions[0];
  const covered = onShow === null ? (moved ? undefined : newest) : revisions.find((revision) => revision.letter === onShow);
  const here = covered ? signedTo(covered, now) : null;
  if (covered && here) {
    const words = onShow === null ? `${covered.letter} signed off to ${voltsWords(here.volts)}, sheet unchanged since` : `Signed off to ${voltsWords(here.volts)}`;
    return { to: here.volts, past: null, struck: null, words, short: `TO ${voltsWords(here.volts)}` };
  }
  const struck = covered ? highest(covered, covered.signOffs.filter((signOff) => !stands(signOff, now))) : null;
  if (covered && struck) {
    return { to: null, past: null, struck: struck.volts, words: `Sign-off of ${covered.letter} to ${voltsWords(struck.volts)} is void`, short: 'VOID' };
  }
  const subject = onShow === null ? 'draft' : onShow;
  const older = revisions.slice(onShow === null ? 0 : revisions.findIndex((revision) => revision.letter === onShow) + 1);
  for (const revision of older) {
    const past = signedTo(revision, now);
    if (past) return { to: null, past: { letter: revision.letter, to: past.volts }, struck: null, words: `${revision.letter} is signed to ${voltsWords(past.volts)} · ${subject} is not`, short: `${revision.letter} TO ${voltsWords(past.volts)}` };
  }
  return { to: null, past: null, struck: null, words: 'Nothing signed off', short: 'NONE' };
}
