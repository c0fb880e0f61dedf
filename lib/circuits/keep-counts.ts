import type { CircuitId } from '@/db/authorized';
import type { Database } from '@/db/client';
import { storeCheck } from '@/db/mutations/circuits';
import type { Finding } from '@/lib/netlist/findings/finding';

/** Counts of a check of the whole plan, with the seq that was checked. */
export async function keepCounts(
  db: Database, circuitId: CircuitId, { seq, contentHash, findings }: { readonly seq: number; readonly contentHash: string; readonly findings: readonly Finding[] }, now = new Date(),
): Promise<void> {
  const failing = findings.filter(({ outcome }) => outcome === 'fail');
  const count = (severity: Finding['severity']) => failing.filter((finding) => finding.severity === severity).length;
  const blocked = failing.filter(({ severity }) => severity === 'stop').map(({ fromVolts }) => fromVolts ?? 0);
  await storeCheck(db, {
    circuitId, seq, contentHash, stops: count('stop'), cautions: count('caution'), advices: count('advice'),
    blockedAt: blocked.length === 0 ? null : Math.min(...blocked), checkedAt: now,
  });
}
