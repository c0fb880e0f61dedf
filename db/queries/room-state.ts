import { and, asc, desc, eq, gt } from 'drizzle-orm';
import type { Database, Executor } from '../client';
import { rtRoom, rtSnapshot, rtUpdate } from '../schema/room';
import { snapshotChecksum, updateChecksum } from './room-checksum';

export type RoomRow = typeof rtRoom.$inferSelect;
export type UpdateRow = typeof rtUpdate.$inferSelect;

/** Stored bytes that are not what was written, or rows that are missing. The room must be quarantined, never emptied. */
export class StoredRoomDamaged extends Error {
  override readonly name = 'StoredRoomDamaged';
}

/** A sheet exactly as stored: apply `updates` in order to an empty Yjs document and it stands at `seq`. */
export interface StoredRoom {
  readonly room: RoomRow;
  readonly seq: number;
  /** Seq that the first of `updates` already covers; 0 when there is no snapshot yet. */
  readonly snapshotSeq: number;
  readonly updates: readonly Uint8Array[];
  /** Bytes of the log after the snapshot. */
  readonly logBytes: number;
}

export async function readRoom(db: Executor, roomId: string): Promise<RoomRow | undefined> {
  const [room] = await db.select().from(rtRoom).where(eq(rtRoom.roomId, roomId));
  return room;
}

/**
 * Committed rows after `afterSeq`, oldest first. `limit` bounds the answer.
 * @throws StoredRoomDamaged when a checksum fails or a row is missing in between
 */
export async function readUpdatesAfter(db: Executor, roomId: string, afterSeq: number, limit?: number): Promise<UpdateRow[]> {
  const query = db.select().from(rtUpdate).where(and(eq(rtUpdate.roomId, roomId), gt(rtUpdate.seq, afterSeq))).orderBy(asc(rtUpdate.seq));
  const rows = await (limit === undefined ? query : query.limit(limit));
  rows.forEach((row, index) => {
    if (row.seq !== afterSeq + 1 + index) throw new StoredRoomDamaged(`Row ${afterSeq + 1 + index} of the log is missing.`);
    if (row.sha256 !== updateChecksum(roomId, row)) throw new StoredRoomDamaged(`Row ${row.seq} of the log fails its checksum.`);
  });
  return rows;
}

/** The newest snapshot's bytes, or undefined when none was taken yet. @throws StoredRoomDamaged */
async function readNewestSnapshot(db: Executor, roomId: string): Promise<{ seq: number; bytes: Uint8Array } | undefined> {
  const [newest] = await db.select({ seq: rtSnapshot.uptoSeq }).from(rtSnapshot)
    .where(eq(rtSnapshot.roomId, roomId)).orderBy(desc(rtSnapshot.uptoSeq)).limit(1);
  return newest && { seq: newest.seq, bytes: await readSnapshot(db, roomId, newest.seq) };
}

/** All parts of one snapshot, joined. @throws StoredRoomDamaged when a part is missing or fails its checksum */
export async function readSnapshot(db: Executor, roomId: string, uptoSeq: number): Promise<Uint8Array> {
  const parts = await db.select().from(rtSnapshot)
    .where(and(eq(rtSnapshot.roomId, roomId), eq(rtSnapshot.uptoSeq, uptoSeq))).orderBy(asc(rtSnapshot.part));
  parts.forEach((part, index) => {
    if (part.part !== index || part.parts !== parts.length || part.sha256 !== snapshotChecksum(roomId, part)) {
      throw new StoredRoomDamaged(`The snapshot at ${uptoSeq} fails its checksum.`);
    }
  });
  return Buffer.concat(parts.map((part) => part.bytes));
}

/**
 * Everything that makes up a sheet, read at one moment. Undefined when the circuit has no room.
 * @throws StoredRoomDamaged when anything stored is not what was written
 */
export async function readStoredRoom(db: Database, roomId: string): Promise<StoredRoom | undefined> {
  return db.transaction(async (tx) => {
    const room = await readRoom(tx, roomId);
    if (!room) return undefined;
    const snapshot = await readNewestSnapshot(tx, roomId);
    const rows = await readUpdatesAfter(tx, roomId, snapshot?.seq ?? 0);
    const seq = rows.at(-1)?.seq ?? snapshot?.seq ?? 0;
    if (seq !== room.headSeq) throw new StoredRoomDamaged(`The log ends at ${seq}, its head says ${room.headSeq}.`);
    const updates = rows.map((row) => row.bytes);
    return {
      room, seq, snapshotSeq: snapshot?.seq ?? 0,
      updates: snapshot ? [snapshot.bytes, ...updates] : updates,
      logBytes: updates.reduce((sum, bytes) => sum + bytes.length, 0),
    };
  }, { isolationLevel: 'repeatable read', accessMode: 'read only' });
}
