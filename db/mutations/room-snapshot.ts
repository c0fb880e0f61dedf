import { and, desc, eq, lt, lte, sql } from 'drizzle-orm';
import type { Database, Transaction } from '../client';
import { snapshotChecksum } from '../queries/room-checksum';
import { rtInstance, rtSnapshot, rtUpdate } from '../schema/room';

/** One part of a snapshot in bytes; well under MariaDB's default packet of 16 MiB. */
const partBytes = 4 * 1024 * 1024;
/** How many snapshots stay; the log goes back to the oldest of them. */
const snapshotsKept = 2;

/** Writes the whole sheet at `uptoSeq`. Rows it covers stay until `forgetCoveredRows`. */
export async function writeSnapshot(tx: Transaction, roomId: string, uptoSeq: number, whole: Uint8Array): Promise<void> {
  const parts = Math.max(1, Math.ceil(whole.length / partBytes));
  for (let part = 0; part < parts; part += 1) {
    const content = { uptoSeq, part, parts, bytes: whole.subarray(part * partBytes, (part + 1) * partBytes) };
    await tx.insert(rtSnapshot).values({ ...content, roomId, sha256: snapshotChecksum(roomId, content) });
  }
}

/**
 * Keeps the two newest snapshots and the log after the older of them; with fewer than two nothing goes.
 * Only called once the newest one was read back and compared.
 */
export async function forgetCoveredRows(db: Database, roomId: string): Promise<void> {
  await db.transaction(async (tx) => {
    const newest = await tx.selectDistinct({ seq: rtSnapshot.uptoSeq }).from(rtSnapshot)
      .where(eq(rtSnapshot.roomId, roomId)).orderBy(desc(rtSnapshot.uptoSeq)).limit(snapshotsKept);
    const oldest = newest.at(-1);
    if (newest.length < snapshotsKept || !oldest) return;
    // What a resend is told apart by outlives the rows it stands in.
    await tx.execute(sql`insert into ${rtInstance} (room_id, instance_id, person_id, last_client_seq, last_seq)
      select room_id, instance_id, max(actor_id), max(client_seq), max(seq) from ${rtUpdate}
      where room_id = ${roomId} and seq <= ${oldest.seq} group by room_id, instance_id
      on duplicate key update last_client_seq = greatest(last_client_seq, values(last_client_seq)), last_seq = greatest(last_seq, values(last_seq))`);
    await tx.delete(rtUpdate).where(and(eq(rtUpdate.roomId, roomId), lte(rtUpdate.seq, oldest.seq)));
    await tx.delete(rtSnapshot).where(and(eq(rtSnapshot.roomId, roomId), lt(rtSnapshot.uptoSeq, oldest.seq)));
  });
}
