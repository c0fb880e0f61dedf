import { monotonicFactory } from 'ulid';
import type { AuditDetail } from '@/lib/schemas/audit';
import type { Executor } from '../client';
import { audit } from '../schema/audit';

const newId = monotonicFactory();

export interface AuditEntry {
  readonly bench: string | null;
  readonly circuit?: string | null;
  /** Null when the server acts by itself. */
  readonly actor: string | null;
  readonly action: string;
  readonly detail?: AuditDetail;
  readonly requestId: string;
}

/** Writes who did what. Called inside the transaction of the change, so that neither exists without the other. */
export async function writeAudit(tx: Executor, entry: AuditEntry): Promise<void> {
  await tx.insert(audit).values({
    id: newId(), benchId: entry.bench, circuitId: entry.circuit ?? null, actorId: entry.actor,
    action: entry.action, detail: entry.detail ?? {}, requestId: entry.requestId, at: new Date(),
  });
}
