import type { Executor } from '../client';
import { rtRoom } from '../schema/room';

/** Opens the room of a new circuit, at seq 0. Called in the transaction that posts the circuit. */
export async function createRoom(db: Executor, roomId: string): Promise<void> {
  await db.insert(rtRoom).values({ roomId });
}
