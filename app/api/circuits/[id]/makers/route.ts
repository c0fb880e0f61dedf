import { circuitViewOf } from '@/lib/circuits/circuit-view';
import { setMakers } from '@/lib/circuits/name-makers';
import { actOf } from '@/lib/http/act-of';
import { given } from '@/lib/http/answer';
import { putMakers } from '@/lib/http/operations/circuits';
import { serve } from '@/lib/http/serve';
import { rooms } from '@/lib/rooms/room-client';

export const PUT = serve(putMakers, async (call) => {
  await setMakers(actOf(call), call.access, call.body.makers);
  await rooms().announce({ circuitId: call.access.circuit, topic: 'circuit' });
  return given(await circuitViewOf(call.db, call.caller, call.access.circuit));
});
