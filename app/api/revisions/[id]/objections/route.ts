import { actOf } from '@/lib/http/act-of';
import { made } from '@/lib/http/answer';
import { objectCall } from '@/lib/http/operations/review';
import { serve } from '@/lib/http/serve';
import { askForChanges } from '@/lib/review/ask-for-changes';
import { oneObjection } from '@/lib/review/read-acts';
import { rooms } from '@/lib/rooms/room-client';

export const POST = serve(objectCall, async (call) => {
  const { value, first } = await askForChanges(actOf(call), call.access, call.body.reason);
  if (first) await rooms().announce({ circuitId: call.access.circuit, topic: 'revisions', data: { id: call.access.revision } });
  return made({ value: await oneObjection(call.db, call.access, value), first });
});
