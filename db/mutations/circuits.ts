import { and, eq, inArray, isNull } from 'drizzle-orm';
import type { BenchId, CircuitId } from '../authorized';
import type { Executor, Transaction } from '../client';
import { circuitChecks, circuitMakers, circuits } from '../schema/circuits';
import { rtRoom, rtUpdate } from '../schema/room';

/** Holds the circuit until the transaction ends: acts of its review happen one after the other. False when it is gone. */
export async function lockCircuit(tx: Transaction, circuit: CircuitId): Promise<{ readonly archivedAt: Date | null } | undefined> {
  const [row] = await tx.select({ archivedAt: circuits.archivedAt }).from(circuits).where(eq(circuits.id, circuit)).for('update');
  return row;
}

export async function insertCircuit(tx: Transaction, row: { id: string; bench: BenchId; title: string; postedBy: string; now: Date }): Promise<void> {
  await tx.insert(circuits).values({ id: row.id, benchId: row.bench, title: row.title, postedBy: row.postedBy, changedAt: row.now, createdAt: row.now });
}

export async function renameCircuit(tx: Transaction, circuit: CircuitId, title: string, now: Date): Promise<void> {
  await tx.update(circuits).set({ title, changedAt: now }).where(eq(circuits.id, circuit));
}

/** Moves a circuit up in the list: something about it changed. */
export async function touchCircuit(db: Executor, circuit: CircuitId, now: Date): Promise<void> {
  await db.update(circuits).set({ changedAt: now }).where(eq(circuits.id, circuit));
}

export async function setArchived(tx: Transaction, circuit: CircuitId, archivedAt: Date | null): Promise<void> {
  await tx.update(circuits).set({ archivedAt }).where(eq(circuits.id, circuit));
}

export async function nameMakers(tx: Transaction, circuitId: CircuitId, makers: readonly { id: string; personId: string }[], since: Date): Promise<void> {
  if (makers.length > 0) await tx.insert(circuitMakers).values(makers.map(({ id, personId }) => ({ id, circuitId, personId, standing: 1, since })));
}

/** Ends makers; their rows stay, since they remain contributors. */
export async function endMakers(tx: Transaction, circuit: CircuitId, personIds: readonly string[], endedAt: Date): Promise<void> {
  if (personIds.length === 0) return;
  await tx.update(circuitMakers).set({ standing: null, endedAt })
    .where(and(eq(circuitMakers.circuitId, circuit), eq(circuitMakers.standing, 1), isNull(circuitMakers.endedAt), inArray(circuitMakers.personId, [...personIds])));
}

/** Keeps the counts of the newest check; an older one that ends late changes nothing. */
export async function storeCheck(db: Executor, row: typeof circuitChecks.$inferInsert): Promise<void> {
  const [known] = await db.select({ seq: circuitChecks.seq }).from(circuitChecks).where(eq(circuitChecks.circuitId, row.circuitId));
  if (known && known.seq > row.seq) return;
  const { circuitId: _, ...counts } = row;
  await db.insert(circuitChecks).values(row).onDuplicateKeyUpdate({ set: counts });
}

/** Takes back a circuit whose first sheet could not be stored. Only for one that nobody has seen yet. */
export async function discardCircuit(tx: Transaction, circuit: CircuitId): Promise<void> {
  await tx.delete(rtUpdate).where(eq(rtUpdate.roomId, circuit));
  await tx.delete(rtRoom).where(eq(rtRoom.roomId, circuit));
  await tx.delete(circuits).where(eq(circuits.id, circuit));
}
