import { actOf } from '@/lib/http/act-of';
import { given } from '@/lib/http/answer';
import { withdrawCall } from '@/lib/http/operations/review';
import { serve } from '@/lib/http/serve';
import { oneSignOff } from '@/lib/review/read-acts';
import { withdrawSignOff } from '@/lib/review/withdraw-sign-off';
import { rooms } from '@/lib/rooms/room-client';

export const DELETE = serve(withdrawCall, async (call) => {
  await withdrawSignOff(actOf(call), call.access, call.body);
  await rooms().announce({ circuitId: call.access.circuit, topic: 'sign-offs', data: { id: call.access.signOff } });
  return given(await oneSignOff(call.db, call.access, call.access.signOff));
});
