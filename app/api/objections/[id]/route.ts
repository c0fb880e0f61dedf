import { actOf } from '@/lib/http/act-of';
import { given } from '@/lib/http/answer';
import { liftCall } from '@/lib/http/operations/review';
import { serve } from '@/lib/http/serve';
import { liftObjection } from '@/lib/review/lift-objection';
import { oneObjection } from '@/lib/review/read-acts';
import { rooms } from '@/lib/rooms/room-client';

export const DELETE = serve(liftCall, async (call) => {
  await liftObjection(actOf(call), call.access, call.body);
  await rooms().announce({ circuitId: call.access.circuit, topic: 'revisions', data: { id: call.access.revision } });
  return given(await oneObjection(call.db, call.access, call.access.objection));
});
