import * as Y from 'yjs';
import type { Database } from '@/db/client';
import { quarantineRoom } from '@/db/mutations/room-quarantine';
import { readStoredRoom, StoredRoomDamaged, type StoredRoom } from '@/db/queries/room-state';

export type LoadedRoom =
  | { readonly kind: 'open'; readonly doc: Y.Doc; readonly seq: number; readonly snapshotSeq: number; readonly logBytes: number }
  | { readonly kind: 'quarantined'; readonly reason: string }
  /** No such room, or deleted for good. */
  | { readonly kind: 'gone' };

/** Builds a document from stored updates. @throws StoredRoomDamaged when they do not make a whole one */
export function buildDocument(updates: readonly Uint8Array[]): Y.Doc {
  const doc = new Y.Doc();
  try {
    for (const update of updates) Y.applyUpdate(doc, update);
  } catch (error) {
    throw new StoredRoomDamaged('A stored update does not decode.', { cause: error });
  }
  if (doc.store.pendingStructs !== null || doc.store.pendingDs !== null) {
    throw new StoredRoomDamaged('A stored update rests on one that is missing.');
  }
  return doc;
}

/**
 * Loads a room's committed document. Stored bytes that fail their checks put the room in quarantine, for good until an
 * operator acts; the document is never started empty instead.
 * @throws the driver's error when the database does not answer
 */
export async function loadRoom(db: Database, roomId: string): Promise<LoadedRoom> {
  try {
    const stored: StoredRoom | undefined = await readStoredRoom(db, roomId);
    if (!stored || stored.room.tombstonedAt !== null) return { kind: 'gone' };
    if (stored.room.quarantinedAt !== null) return { kind: 'quarantined', reason: stored.room.quarantineReason ?? '' };
    return {
      kind: 'open', doc: buildDocument(stored.updates), seq: stored.seq, snapshotSeq: stored.snapshotSeq, logBytes: stored.logBytes,
    };
  } catch (error) {
    if (!(error instanceof StoredRoomDamaged)) throw error;
    await quarantineRoom(db, roomId, error.message);
    return { kind: 'quarantined', reason: error.message };
  }
}
