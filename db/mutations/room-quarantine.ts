import { and, eq, isNull } from 'drizzle-orm';
import type { Database } from '../client';
import { rtRoom } from '../schema/room';

/** Marks a room's stored copy as damaged: nothing is appended until an operator has restored it and cleared the mark. */
export async function quarantineRoom(db: Database, roomId: string, reason: string, now = new Date()): Promise<void> {
  await db.update(rtRoom).set({ quarantinedAt: now, quarantineReason: reason.slice(0, 500) })
    .where(and(eq(rtRoom.roomId, roomId), isNull(rtRoom.quarantinedAt)));
}
