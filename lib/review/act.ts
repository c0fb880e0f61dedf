import type { Database } from '@/db/client';
import type { AuditEntry } from '@/db/mutations/audit';
import type { Person } from '@/lib/access/caller';
import type { CircuitAccess, RevisionAccess } from '@/lib/access/gates';
import { Problem } from '@/lib/errors/problem';

/** Who acts, where, under which request: what every use case of the review takes. */
export interface Act {
  readonly db: Database;
  readonly person: Person;
  readonly requestId: string;
  /** Passed in so that a test decides what time it is. */
  readonly now: Date;
  /** Id of what the act makes when it came with an idempotency key; one that is made already is answered, not made again. */
  readonly thing?: string | undefined;
}

/** What a use case answers: the thing, and whether this was the first time. A repeat is answered with the first one's. */
export interface Outcome<T> { readonly value: T; readonly first: boolean }

export const first = <T>(value: T): Outcome<T> => ({ value, first: true });
export const repeat = <T>(value: T): Outcome<T> => ({ value, first: false });

export const entry = (act: Act, access: CircuitAccess | RevisionAccess, action: string, detail: AuditEntry['detail']): AuditEntry => ({
  bench: access.bench, circuit: access.circuit, actor: act.person.id, action, detail, requestId: act.requestId,
});

/** An archived circuit takes no change but being restored. */
export function refuseArchived(circuit: { readonly archivedAt: Date | null } | undefined): void {
  if (!circuit) throw new Problem('not-found');
  if (circuit.archivedAt !== null) throw new Problem('archived');
}
