import type { BenchId, CircuitId, MessageId, PersonId, RevisionId, ThreadId } from '@/db/authorized';

/** Only gates, and the server's own jobs (`lib/access/system.ts`), call these. */
export const mintBench = (id: string) => id as BenchId;
export const mintCircuit = (id: string) => id as CircuitId;
export const mintRevision = (id: string) => id as RevisionId;
export const mintThread = (id: string) => id as ThreadId;
export const mintMessage = (id: string) => id as MessageId;
export const mintPerson = (id: string) => id as PersonId;
