import type { RevisionState } from '@/lib/schemas/revision';

/** What a revision's state follows from. */
export interface StateFacts {
  readonly asked: boolean;
  /** A newer revision of the circuit was put up for review. */
  readonly newerAsked: boolean;
  readonly standingSignOffs: number;
  readonly withdrawnSignOffs: number;
  /** Somebody's 'ask for changes' is in force on the circuit, whichever revision it was written on. */
  readonly objected: boolean;
}

/** A revision's state. Worked out whenever it is read, never stored: nothing can leave it out of step with its causes. */
export function revisionState(facts: StateFacts): RevisionState {
  if (facts.standingSignOffs > 0) return 'signed off';
  if (facts.withdrawnSignOffs > 0) return 'withdrawn';
  if (facts.newerAsked) return 'superseded';
  if (!facts.asked) return 'cut';
  return facts.objected ? 'changes asked' : 'in review';
}
