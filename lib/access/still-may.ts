import type { Transaction } from '@/db/client';
import type { CircuitId, RevisionId } from '@/db/authorized';
import { partIn, standingOf } from '@/db/queries/standing';
import { Problem } from '@/lib/errors/problem';
import type { Caller } from './caller';
import type { Standing } from './may';
import { refuseUnless } from './refuse';
import type { Action } from './rights';

export interface Decided {
  readonly circuit: CircuitId;
  readonly postedBy?: string;
  readonly revision?: RevisionId;
  readonly author?: boolean;
  /** Where no revision decides it: part in the live sheet. */
  readonly contributor?: boolean;
}

/**
 * Decides once more inside the transaction that acts, with the membership held: who lost the right between the gate and
 * the commit does not act. Answers the standing as it is now.
 */
export async function stillMay(tx: Transaction, person: NonNullable<Caller['person']>['id'], actions: readonly Action[], { circuit, postedBy, revision, author, contributor }: Decided): Promise<Standing> {
  const row = await standingOf(tx, circuit, person, { lock: true });
  if (!row) throw new Problem('not-found');
  const part = revision ? await partIn(tx, revision, person) : {};
  const standing: Standing = { role: row.role, maker: row.makerRow !== null, poster: postedBy === person, author, contributor, ...part };
  refuseUnless(actions, standing);
  return standing;
}
