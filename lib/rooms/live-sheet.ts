import type { CircuitId } from '@/db/authorized';
import type { Database } from '@/db/client';
import { readRoom, readStoredRoom, StoredRoomDamaged } from '@/db/queries/room-state';
import { decodeDocument, encodeDocument } from '@/lib/document/encode-sheet';
import { contentHashOf } from '@/lib/document/nets/sheet-to-netlist';
import { readSheet } from '@/lib/document/read-sheet';
import type { Sheet } from '@/lib/document/records';
import { Problem } from '@/lib/errors/problem';

/** The committed sheet at one seq. */
export interface LiveSheet {
  readonly seq: number;
  readonly sheet: Sheet;
  /** The whole document as one Yjs update. */
  readonly bytes: Uint8Array;
  readonly contentHash: string;
}

/** Sheets kept decoded: lists read many that rarely change. */
const kept = 200;
const shared = globalThis as typeof globalThis & { holdoffSheets?: Map<string, LiveSheet> };
const cache = (shared.holdoffSheets ??= new Map());

/**
 * The sheet as committed to MariaDB. Decoded anew only when the head has moved; never from what a client claims.
 * Throws `unavailable` when the stored copy is damaged: a damaged sheet is never shown as an empty one.
 */
export async function readLiveSheet(db: Database, circuit: CircuitId): Promise<LiveSheet> {
  const room = await readRoom(db, circuit);
  const known = cache.get(circuit);
  if (room && known?.seq === room.headSeq && room.quarantinedAt === null) return known;
  const live = await decodeStored(db, circuit);
  cache.delete(circuit);
  cache.set(circuit, live);
  const oldest = cache.keys().next();
  if (cache.size > kept && !oldest.done) cache.delete(oldest.value);
  return live;
}

async function decodeStored(db: Database, circuit: CircuitId): Promise<LiveSheet> {
  try {
    const stored = await readStoredRoom(db, circuit);
    if (!stored) throw new Problem('not-found');
    const doc = decodeDocument(stored.updates);
    const { sheet } = readSheet(doc);
    return { seq: stored.seq, sheet, bytes: encodeDocument(doc), contentHash: contentHashOf(sheet) };
  } catch (error) {
    if (error instanceof StoredRoomDamaged) {
      throw new Problem('unavailable', 'The stored copy of this sheet is damaged; its revisions can still be read.', { retryAfter: 60 });
    }
    throw error;
  }
}
