import { messageGate } from '@/lib/access/gates';
import { actOf } from '@/lib/http/act-of';
import { made } from '@/lib/http/answer';
import { replyCall } from '@/lib/http/operations/review';
import { serve } from '@/lib/http/serve';
import { messageViewOf } from '@/lib/review/thread-view';
import { reply } from '@/lib/review/write-note';
import { rooms } from '@/lib/rooms/room-client';

export const POST = serve(replyCall, async (call) => {
  const { value, first } = await reply(actOf(call), call.access, call.body.body);
  await rooms().announce({ circuitId: call.access.circuit, topic: 'threads', data: { id: call.access.thread } });
  return made({ value: await messageViewOf(call.db, await messageGate(call.db, call.caller, value)), first });
});
