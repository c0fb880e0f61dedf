import { actOf } from '@/lib/http/act-of';
import { made } from '@/lib/http/answer';
import { askCall } from '@/lib/http/operations/review';
import { serve } from '@/lib/http/serve';
import { askForReview } from '@/lib/review/ask-for-review';
import { revisionView } from '@/lib/review/read-revision';
import { rooms } from '@/lib/rooms/room-client';

export const POST = serve(askCall, async (call) => {
  const { first } = await askForReview(actOf(call), call.access, call.body);
  if (first) await rooms().announce({ circuitId: call.access.circuit, topic: 'revisions', data: { id: call.access.revision } });
  return made({ value: await revisionView(call.db, call.access, call.access.revision), first });
});
