import { and, desc, eq, inArray, lt, sql } from 'drizzle-orm';
import type { BenchId } from '../authorized';
import type { Executor } from '../client';
import { audit } from '../schema/audit';

/** A page of a bench's audit record, newest first; `circuits` limits it to rows of those. */
export async function auditRows(db: Executor, bench: BenchId, { before, limit, circuits }: { before?: string | undefined; limit: number; circuits: readonly string[] | null }) {
  return db.select({ id: audit.id, at: audit.at, actorId: audit.actorId, action: audit.action, circuitId: audit.circuitId, detail: audit.detail }).from(audit)
    .where(and(
      eq(audit.benchId, bench),
      before === undefined ? undefined : lt(audit.id, before),
      circuits === null ? undefined : circuits.length === 0 ? sql`false` : inArray(audit.circuitId, [...circuits]),
    )).orderBy(desc(audit.id)).limit(limit);
}
