import { signIn } from '@/lib/auth/sign-in';
import { signOut } from '@/lib/auth/sign-out';
import { who } from '@/lib/auth/who';
import { environment } from '@/lib/env/environment';
import { empty, given } from '@/lib/http/answer';
import { clearCookie, setCookie } from '@/lib/http/cookies';
import { signInCall, signOutCall, whoAmI } from '@/lib/http/operations/people';
import { serve } from '@/lib/http/serve';
import { rooms } from '@/lib/rooms/room-client';

export const GET = serve(whoAmI, async ({ db, person }) => given(await who(db, person.id)));

export const POST = serve(signInCall, async ({ db, body, address, requestId, request, caller }) => {
  const userAgent = request.headers.get('user-agent') ?? '';
  const { token, personId } = await signIn(db, body, { address, requestId, userAgent });
  // A new session for every sign-in: the one that the browser had ends.
  if (caller.person) await signOut(db, caller.person, requestId);
  return { status: 201, body: await who(db, personId), headers: { 'set-cookie': setCookie('session', token, environment().secure) } };
});

export const DELETE = serve(signOutCall, async ({ db, person, requestId }) => {
  await signOut(db, person, requestId);
  await rooms().revoke({ sessionId: person.session.id });
  return empty({ 'set-cookie': clearCookie('session', environment().secure) });
});
