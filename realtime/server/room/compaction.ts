import * as Y from 'yjs';
import type { Database } from '@/db/client';
import { forgetCoveredRows, writeSnapshot } from '@/db/mutations/room-snapshot';
import { readSnapshot } from '@/db/queries/room-state';
import { inTransaction } from '@/db/transaction';
import { buildDocument } from './load-room';

/** Why a snapshot was not kept; the log is untouched then. */
export class SnapshotMismatch extends Error {
  override readonly name = 'SnapshotMismatch';
}

const sameBytes = (a: Uint8Array, b: Uint8Array) => Buffer.compare(a, b) === 0;

/**
 * Stores the whole sheet at `seq`, reads it back, builds a document from it and compares state vector and content hash
 * before it is committed; only then go rows that an older kept snapshot covers. Edits may go on meanwhile: they are rows
 * after `seq`, which stay.
 * @throws SnapshotMismatch when what was stored is not the sheet
 */
export async function takeSnapshot(
  db: Database, roomId: string, committed: Y.Doc, seq: number, contentHash: (doc: Y.Doc) => string,
): Promise<void> {
  const whole = Y.encodeStateAsUpdate(committed);
  const vector = Y.encodeStateVector(committed);
  const hash = contentHash(committed);
  await inTransaction(db, async (tx) => {
    await writeSnapshot(tx, roomId, seq, whole);
    const again = buildDocument([await readSnapshot(tx, roomId, seq)]);
    try {
      if (!sameBytes(Y.encodeStateVector(again), vector) || contentHash(again) !== hash) {
        throw new SnapshotMismatch(`The snapshot at ${seq} reads back as another sheet.`);
      }
    } finally {
      again.destroy();
    }
  });
  await forgetCoveredRows(db, roomId);
}
