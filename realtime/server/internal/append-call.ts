import { appendCallSchema, type AppendAnswer } from '@/realtime/internal-calls';
import { appendOnce } from '../room/append-once';
import type { RoomContext } from '../room/room-context';
import type { RoomRegistry } from '../room/room-registry';

const statusOf: Readonly<Record<AppendAnswer['kind'], number>> = {
  committed: 200, 'sheet-moved': 409, 'not-allowed': 403, 'not-found': 404, refused: 422, unavailable: 503,
};

/** One edit over HTTP: the room is opened if nobody has it open. */
export async function answerAppend(context: RoomContext, rooms: RoomRegistry, body: unknown): Promise<{ status: number; body: unknown }> {
  const call = appendCallSchema.safeParse(body);
  if (!call.success) return { status: 400, body: { kind: 'bad-call', issues: call.error.issues } };
  const answer = await append(context, rooms, call.data);
  return { status: statusOf[answer.kind], body: answer };
}

async function append(
  context: RoomContext, rooms: RoomRegistry, call: { circuitId: string; actorId: string; sessionId: string | null; update: string; baseSeq?: number | undefined; key: string },
): Promise<AppendAnswer> {
  try {
    const opened = await rooms.open(call.circuitId);
    if (opened.kind === 'gone') return { kind: 'not-found' };
    if (opened.kind === 'quarantined') return { kind: 'unavailable', words: 'The stored copy of this sheet is damaged.' };
    const { actorId, sessionId, baseSeq, key } = call;
    return await appendOnce(context, opened.room, { actorId, sessionId, baseSeq, key, update: Buffer.from(call.update, 'base64') });
  } catch (error) {
    context.log.error({ circuitId: call.circuitId, err: error }, 'an edit over HTTP failed');
    return { kind: 'unavailable', words: 'The database does not answer.' };
  } finally {
    rooms.release(call.circuitId);
  }
}
