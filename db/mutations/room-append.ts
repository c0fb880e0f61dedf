import { and, eq, isNull, sql } from 'drizzle-orm';
import type { Database } from '../client';
import { updateChecksum } from '../queries/room-checksum';
import { readRoomGrant } from '../queries/room-grant';
import { rtContributor, rtInstance, rtRoom, rtUpdate } from '../schema/room';

export interface RowActor {
  readonly personId: string;
  readonly sessionId: string | null;
  /** The grant under which the edit was let in; it must still stand at the commit. */
  readonly grantVersion: string;
}

export interface RowToAppend {
  readonly instanceId: string;
  readonly clientSeq: number;
  readonly actor: RowActor;
  readonly electrical: boolean;
  readonly bytes: Uint8Array;
}

export type AppendOutcome =
  /** Every row is committed; the first has seq `headSeq + 1`. */
  | { readonly kind: 'committed' }
  /** Nothing was written: these actors' grants changed. Split the batch and go on with the others. */
  | { readonly kind: 'refused'; readonly actors: readonly RowActor[] }
  /** Nothing was written: the head is not where the caller thinks, or the room is quarantined or gone. */
  | { readonly kind: 'moved' };

class Undone extends Error {
  constructor(readonly outcome: AppendOutcome) {
    super('The append was rolled back.');
  }
}

/** Key of an actor; two rows with one key share a grant check. */
export const rowActorKey = (actor: RowActor) => `${actor.personId} ${actor.sessionId ?? ''} ${actor.grantVersion}`;

/**
 * Appends rows to a room's log in one transaction, at `headSeq + 1` and up: all or none. Every actor's grant is read under
 * a lock inside it, so that no row is committed after the commit that took the actor's right away.
 * @throws the driver's error when the database fails; whether a COMMIT that was under way took place is then unknown
 */
export async function appendRows(db: Database, roomId: string, headSeq: number, rows: readonly RowToAppend[]): Promise<AppendOutcome> {
  try {
    await db.transaction(async (tx) => {
      const actors = new Map(rows.map(({ actor }) => [rowActorKey(actor), actor]));
      const refused: RowActor[] = [];
      for (const actor of actors.values()) {
        const grant = await readRoomGrant(tx, roomId, actor, { lock: true });
        if (grant?.version !== actor.grantVersion) refused.push(actor);
      }
      if (refused.length > 0) throw new Undone({ kind: 'refused', actors: refused });

      const [head] = await tx.update(rtRoom).set({ headSeq: headSeq + rows.length }).where(and(
        eq(rtRoom.roomId, roomId), eq(rtRoom.headSeq, headSeq), isNull(rtRoom.quarantinedAt), isNull(rtRoom.tombstonedAt),
      ));
      if (head.affectedRows !== 1) throw new Undone({ kind: 'moved' });

      const stored = rows.map((row, index) => ({
        seq: headSeq + 1 + index, instanceId: row.instanceId, clientSeq: row.clientSeq, actorId: row.actor.personId,
        sessionId: row.actor.sessionId, electrical: row.electrical, bytes: row.bytes,
      }));
      await tx.insert(rtUpdate).values(stored.map((row) => ({ ...row, roomId, sha256: updateChecksum(roomId, row) })));

      const progress = new Map(stored.map((row) => [row.instanceId, row]));
      await tx.insert(rtInstance).values([...progress.values()].map((row) => ({
        roomId, instanceId: row.instanceId, personId: row.actorId, lastClientSeq: row.clientSeq, lastSeq: row.seq,
      }))).onDuplicateKeyUpdate({ set: { lastClientSeq: sql`values(last_client_seq)`, lastSeq: sql`values(last_seq)` } });

      const electrical = new Map(stored.filter((row) => row.electrical).reverse().map((row) => [row.actorId, row.seq]));
      if (electrical.size > 0) {
        await tx.insert(rtContributor).ignore()
          .values([...electrical].map(([personId, firstSeq]) => ({ roomId, personId, firstSeq })));
      }
    });
    return { kind: 'committed' };
  } catch (error) {
    if (error instanceof Undone) return error.outcome;
    throw error;
  }
}
