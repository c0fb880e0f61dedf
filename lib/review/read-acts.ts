import type { Executor } from '@/db/client';
import { namesOf } from '@/db/queries/names';
import { objectionById, signOffById } from '@/db/queries/review';
import type { CircuitAccess } from '@/lib/access/gates';
import { Problem } from '@/lib/errors/problem';
import type { Objection, SignOff } from '@/lib/schemas/revision';
import { namingFor } from './naming';
import { objectionView, signOffView } from './review-view';

/** One sign-off as its reader sees it. */
export async function oneSignOff(db: Executor, access: CircuitAccess, id: string): Promise<SignOff> {
  const row = await signOffById(db, id);
  if (!row) throw new Problem('not-found');
  return signOffView(row, namingFor(access.standing)(await namesOf(db, [row.by, row.withdrawnBy ?? row.by])));
}

/** One objection as its reader sees it. */
export async function oneObjection(db: Executor, access: CircuitAccess, id: string): Promise<Objection> {
  const row = await objectionById(db, id);
  if (!row) throw new Problem('not-found');
  return objectionView(row, namingFor(access.standing)(await namesOf(db, [row.by, row.liftedBy ?? row.by])));
}
