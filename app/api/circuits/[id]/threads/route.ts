import { threadGate } from '@/lib/access/gates';
import { actOf } from '@/lib/http/act-of';
import { given, made } from '@/lib/http/answer';
import { listThreads, openThread } from '@/lib/http/operations/review';
import { serve } from '@/lib/http/serve';
import { listThreadViews, threadView } from '@/lib/review/thread-view';
import { openNote } from '@/lib/review/write-note';
import { rooms } from '@/lib/rooms/room-client';

export const GET = serve(listThreads, async ({ db, access }) => given({ items: await listThreadViews(db, access) }));

export const POST = serve(openThread, async (call) => {
  const { value: id, first } = await openNote(actOf(call), call.access, call.body);
  await rooms().announce({ circuitId: call.access.circuit, topic: 'threads', data: { id } });
  return made({ value: await threadView(call.db, await threadGate(call.db, call.caller, id)), first });
});
