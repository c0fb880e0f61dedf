import { actOf } from '@/lib/http/act-of';
import { given } from '@/lib/http/answer';
import { moveThread } from '@/lib/http/operations/review';
import { serve } from '@/lib/http/serve';
import { moveNote } from '@/lib/review/move-note';
import { threadView } from '@/lib/review/thread-view';
import { rooms } from '@/lib/rooms/room-client';

export const PATCH = serve(moveThread, async (call) => {
  await moveNote(actOf(call), call.access, call.body);
  await rooms().announce({ circuitId: call.access.circuit, topic: 'threads', data: { id: call.access.thread } });
  return given(await threadView(call.db, call.access));
});
