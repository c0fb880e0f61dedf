import { endOwnSessions, listOwnSessions } from '@/lib/auth/own-sessions';
import { empty, given } from '@/lib/http/answer';
import { endSessions, listSessions } from '@/lib/http/operations/people';
import { serve } from '@/lib/http/serve';
import { rooms } from '@/lib/rooms/room-client';

export const GET = serve(listSessions, async ({ db, person }) => given({ items: await listOwnSessions(db, person), next: null }));

export const DELETE = serve(endSessions, async ({ db, person, body, requestId }) => {
  const ended = await endOwnSessions(db, person, body.id, requestId);
  for (const sessionId of ended) await rooms().revoke({ sessionId });
  return empty();
});
