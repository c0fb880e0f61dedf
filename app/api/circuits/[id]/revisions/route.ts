import { actOf } from '@/lib/http/act-of';
import { given, made } from '@/lib/http/answer';
import { cutCall, listRevisions } from '@/lib/http/operations/review';
import { serve } from '@/lib/http/serve';
import { cutRevision } from '@/lib/review/cut-revision';
import { revisionPage, revisionView } from '@/lib/review/read-revision';
import { rooms } from '@/lib/rooms/room-client';

export const GET = serve(listRevisions, async ({ db, access, query }) => given(await revisionPage(db, access, query)));

export const POST = serve(cutCall, async (call) => {
  const { value, first } = await cutRevision(actOf(call), call.access, call.body);
  if (first) await rooms().announce({ circuitId: call.access.circuit, topic: 'revisions', data: { id: value } });
  return made({ value: await revisionView(call.db, call.access, value), first });
});
