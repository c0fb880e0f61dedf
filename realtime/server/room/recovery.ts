import { setTimeout as pause } from 'node:timers/promises';
import { probeAppend } from '@/db/mutations/room-probe';
import { quarantineRoom } from '@/db/mutations/room-quarantine';
import { readRoom, readUpdatesAfter, StoredRoomDamaged, type UpdateRow } from '@/db/queries/room-state';
import type { RoomContext } from './room-context';

export type Recovered =
  | { readonly kind: 'rows'; readonly rows: readonly UpdateRow[] }
  | { readonly kind: 'quarantined'; readonly reason: string }
  | { readonly kind: 'gone' };

/**
 * Waits, with growing pauses, until the database answers and would take a row again; then says what the log holds after
 * `head()`: a COMMIT whose answer was lost may have taken place. Undefined when `wanted` turned false meanwhile.
 */
export async function recoverRows(
  { db, timing, log }: RoomContext, roomId: string, head: () => number, wanted: () => boolean,
): Promise<Recovered | undefined> {
  for (let wait = timing.recoveryFirst; wanted(); wait = Math.min(wait * 2, timing.recoveryLongest)) {
    await pause(wait);
    try {
      const room = await readRoom(db, roomId);
      if (!room || room.tombstonedAt !== null) return { kind: 'gone' };
      if (room.quarantinedAt !== null) return { kind: 'quarantined', reason: room.quarantineReason ?? '' };
      const rows = await readUpdatesAfter(db, roomId, head());
      await probeAppend(db, roomId, room.headSeq);
      return { kind: 'rows', rows };
    } catch (error) {
      if (error instanceof StoredRoomDamaged) {
        await quarantineRoom(db, roomId, error.message);
        return { kind: 'quarantined', reason: error.message };
      }
      log.warn({ circuitId: roomId, err: error }, 'the database does not take edits yet');
    }
  }
  return undefined;
}
