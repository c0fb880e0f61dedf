import { and, desc, eq, isNull, sql } from 'drizzle-orm';
import { ulid } from 'ulid';
import type { Executor } from '../client';
import { circuits, guestLinks } from '../schema/circuits';

export interface NewGuestLink {
  readonly circuit: string;
  readonly tokenHash: string;
  readonly madeBy: string;
  /** True for the link behind the landing page. */
  readonly demo: boolean;
  readonly expiresAt: Date;
}

export async function insertGuestLink(db: Executor, link: NewGuestLink): Promise<string> {
  const id = ulid();
  await db.insert(guestLinks).values({ id, circuitId: link.circuit, tokenHash: link.tokenHash, madeBy: link.madeBy, demo: link.demo ? 1 : 0, expiresAt: link.expiresAt });
  return id;
}

/** The circuit that the landing page opens, when there is one. */
export async function demoCircuit(db: Executor): Promise<{ circuitId: string } | undefined> {
  const [row] = await db.select({ circuitId: guestLinks.circuitId }).from(guestLinks).innerJoin(circuits, eq(circuits.id, guestLinks.circuitId))
    .where(and(eq(guestLinks.demo, 1), isNull(guestLinks.endedAt), isNull(circuits.archivedAt), sql`${guestLinks.expiresAt} > utc_timestamp(3)`))
    .orderBy(desc(guestLinks.id)).limit(1);
  return row;
}
