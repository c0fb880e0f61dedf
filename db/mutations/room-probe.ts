import { eq } from 'drizzle-orm';
import type { Database } from '../client';
import { rtRoom, rtUpdate } from '../schema/room';

class RolledBack extends Error {}

/**
 * Tries, and takes back, exactly what an append does: a full disk, a read-only server or a lost privilege fails here,
 * before people are told that edits are saved again.
 * @throws the driver's error while appends cannot succeed
 */
export async function probeAppend(db: Database, roomId: string, headSeq: number): Promise<void> {
  try {
    await db.transaction(async (tx) => {
      await tx.update(rtRoom).set({ headSeq }).where(eq(rtRoom.roomId, roomId));
      await tx.insert(rtUpdate).values({
        roomId, seq: headSeq + 1, instanceId: 'probe', clientSeq: 0, actorId: roomId, sessionId: null, electrical: false,
        bytes: new Uint8Array(), sha256: '0'.repeat(64),
      });
      throw new RolledBack();
    });
  } catch (error) {
    if (!(error instanceof RolledBack)) throw error;
  }
}
