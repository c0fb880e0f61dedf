import { actOf } from '@/lib/http/act-of';
import { given } from '@/lib/http/answer';
import { editMessage } from '@/lib/http/operations/review';
import { serve } from '@/lib/http/serve';
import { messageViewOf } from '@/lib/review/thread-view';
import { rewrite } from '@/lib/review/write-note';
import { rooms } from '@/lib/rooms/room-client';

export const PATCH = serve(editMessage, async (call) => {
  await rewrite(actOf(call), call.access, call.body.body);
  await rooms().announce({ circuitId: call.access.circuit, topic: 'threads', data: { id: call.access.thread } });
  return given(await messageViewOf(call.db, call.access));
});
