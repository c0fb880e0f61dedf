import { pino } from 'pino';
import type { Database } from '@/db/client';
import type { AnnounceCall, AppendAnswer, RevokeCall } from '@/realtime/internal-calls';
import { answerAppend } from '@/realtime/server/internal/append-call';
import { documentHash } from '@/realtime/server/room/content-hash';
import { roomTiming } from '@/realtime/server/room/room-context';
import { RoomRegistry } from '@/realtime/server/room/room-registry';
import type { RoomClient } from '@/lib/rooms/room-client';

/** The realtime process's own rooms, called without a socket in between, for the seed and for tests; what it was told is kept. */
export interface InProcessRooms extends RoomClient {
  readonly announced: AnnounceCall[];
  readonly revoked: RevokeCall[];
  close(): Promise<void>;
}

export function inProcessRooms(db: Database): InProcessRooms {
  const context = { db, log: pino({ level: 'silent' }), contentHash: documentHash, timing: roomTiming };
  const registry = new RoomRegistry(context);
  const announced: AnnounceCall[] = [];
  const revoked: RevokeCall[] = [];
  return {
    announced, revoked,
    append: async (call) => (await answerAppend(context, registry, call)).body as AppendAnswer,
    announce: async (call) => void announced.push(call),
    revoke: async (call) => void revoked.push(call),
    healthy: async () => true,
    close: () => registry.closeAll('restarting'),
  };
}
