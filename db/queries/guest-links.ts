import { and, desc, eq, isNull, sql } from 'drizzle-orm';
import type { Executor } from '../client';
import { circuits, guestLinks } from '../schema/circuits';

/** The circuit that the landing page opens, when there is one. */
export async function demoCircuit(db: Executor): Promise<{ circuitId: string } | undefined> {
  const [row] = await db.select({ circuitId: guestLinks.circuitId }).from(guestLinks).innerJoin(circuits, eq(circuits.id, guestLinks.circuitId))
    .where(and(eq(guestLinks.demo, 1), isNull(guestLinks.endedAt), isNull(circuits.archivedAt), sql`${guestLinks.expiresAt} > utc_timestamp(3)`))
    .orderBy(desc(guestLinks.id)).limit(1);
  return row;
}
