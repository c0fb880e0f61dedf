import { and, desc, eq, inArray } from 'drizzle-orm';
import type { Database } from '../client';
import { rtClient, rtInstance, rtUpdate } from '../schema/room';

export interface InstanceProgress {
  /** Highest edit of the browser copy that is committed, and the room seq it got; 0 before the first. */
  readonly committed: number;
  readonly seq: number;
}

/**
 * How far a browser copy is committed, from the log or, where its rows are compacted away, from what was kept of them;
 * undefined when it is another person's.
 */
export async function openInstance(
  db: Database, roomId: string, instanceId: string, personId: string,
): Promise<InstanceProgress | undefined> {
  const [row] = await db.select({ personId: rtUpdate.actorId, committed: rtUpdate.clientSeq, seq: rtUpdate.seq }).from(rtUpdate)
    .where(and(eq(rtUpdate.roomId, roomId), eq(rtUpdate.instanceId, instanceId))).orderBy(desc(rtUpdate.clientSeq)).limit(1);
  const [kept] = row ? [] : await db.select({ personId: rtInstance.personId, committed: rtInstance.lastClientSeq, seq: rtInstance.lastSeq })
    .from(rtInstance).where(and(eq(rtInstance.roomId, roomId), eq(rtInstance.instanceId, instanceId)));
  const known = row ?? kept;
  if (!known) return { committed: 0, seq: 0 };
  return known.personId === personId ? { committed: known.committed, seq: known.seq } : undefined;
}

/**
 * Registers Yjs client ids to a person, for good. Ids that were registered to somebody else stay theirs.
 * @returns the ids of `clientIds` that are this person's afterwards
 */
export async function registerClients(db: Database, roomId: string, clientIds: readonly number[], personId: string): Promise<number[]> {
  if (clientIds.length === 0) return [];
  await db.insert(rtClient).ignore().values(clientIds.map((clientId) => ({ roomId, clientId, personId })));
  const rows = await db.select({ clientId: rtClient.clientId }).from(rtClient)
    .where(and(eq(rtClient.roomId, roomId), inArray(rtClient.clientId, [...clientIds]), eq(rtClient.personId, personId)));
  return rows.map((row) => row.clientId);
}
