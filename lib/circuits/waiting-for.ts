import type { RevisionState } from '@/lib/schemas/revision';

/** What decides whose turn it is. */
export interface TurnFacts {
  /** State of the newest revision; null before the first cut. */
  readonly state: RevisionState | null;
  /** The sheet differs electrically from the newest revision. */
  readonly draft: boolean;
  /** Stops of the live sheet, null before its first check. */
  readonly openStops: number | null;
  readonly makers: readonly string[];
  /** Named reviewers of the revision under review; empty means any mentor. */
  readonly reviewers: readonly string[];
  /** Mentors of the bench who made no part of the revision. */
  readonly mentors: readonly string[];
  readonly mustAnswer: number;
  /** The plan is signed to its end. */
  readonly signedToTheEnd: boolean;
}

export interface Turn { readonly person: string; readonly why: string }

const all = (people: readonly string[], why: string): Turn[] => people.map((person) => ({ person, why }));

/** Who must act now, and why: makers while something stands in the way, reviewers while a revision is under review, else nobody. */
export function waitingFor(facts: TurnFacts): Turn[] {
  const makers = facts.makers.slice(0, 1);
  if (facts.state === 'changes asked') return all(makers, 'changes are asked for');
  if (facts.state === 'in review') {
    if (facts.mustAnswer > 0) return all(makers, 'a note must be answered');
    return all(facts.reviewers.length > 0 ? facts.reviewers : facts.mentors, 'review');
  }
  if (facts.state === 'signed off' && !facts.draft) return facts.signedToTheEnd ? [] : all(makers, 'the next hold point');
  if (facts.openStops !== null && facts.openStops > 0) return all(makers, facts.openStops === 1 ? 'answer 1 stop' : `answer ${facts.openStops} stops`);
  return all(makers, facts.state === 'cut' && !facts.draft ? 'ask for review' : 'cut a revision');
}
