import { and, eq } from 'drizzle-orm';
import type { Transaction } from '../client';
import { objections, signOffs } from '../schema/review';

export async function insertSignOff(tx: Transaction, row: Omit<typeof signOffs.$inferInsert, 'standing' | 'withdrawnAt' | 'withdrawnBy' | 'withdrawReason'>): Promise<void> {
  await tx.insert(signOffs).values({ ...row, standing: 1 });
}

/** Makes a standing sign-off void; false when it was already. */
export async function voidSignOff(tx: Transaction, id: string, by: string, at: Date, reason: string | null): Promise<boolean> {
  const [result] = await tx.update(signOffs).set({ standing: null, withdrawnAt: at, withdrawnBy: by, withdrawReason: reason })
    .where(and(eq(signOffs.id, id), eq(signOffs.standing, 1)));
  return result.affectedRows > 0;
}

export async function insertObjection(tx: Transaction, row: Pick<typeof objections.$inferInsert, 'id' | 'circuitId' | 'revisionId' | 'by' | 'at' | 'reason'>): Promise<void> {
  await tx.insert(objections).values({ ...row, standing: 1 });
}

/** Ends an objection in force; false when it was ended before. `overrideReason` is set when a steward does it. */
export async function endObjection(tx: Transaction, id: string, by: string, at: Date, overrideReason: string | null): Promise<boolean> {
  const [result] = await tx.update(objections).set({ standing: null, liftedAt: at, liftedBy: by, overrideReason })
    .where(and(eq(objections.id, id), eq(objections.standing, 1)));
  return result.affectedRows > 0;
}
