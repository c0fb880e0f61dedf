import { actOf } from '@/lib/http/act-of';
import { made } from '@/lib/http/answer';
import { signOffCall } from '@/lib/http/operations/review';
import { serve } from '@/lib/http/serve';
import { oneSignOff } from '@/lib/review/read-acts';
import { signOff } from '@/lib/review/sign-off';
import { rooms } from '@/lib/rooms/room-client';

export const POST = serve(signOffCall, async (call) => {
  const { value, first } = await signOff(actOf(call), call.access, call.body);
  if (first) await rooms().announce({ circuitId: call.access.circuit, topic: 'sign-offs', data: { id: value } });
  return made({ value: await oneSignOff(call.db, call.access, value), first });
});
