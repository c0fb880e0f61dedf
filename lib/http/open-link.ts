import { demoCircuit } from '@/db/queries/guest-links';
import { guestLinkByHash } from '@/db/queries/standing';
import { newestRevisionLetter } from '@/db/queries/revisions';
import type { Database } from '@/db/client';
import { demoToken } from '@/lib/auth/demo-token';
import { tokenHash } from '@/lib/auth/token';
import { environment } from '@/lib/env/environment';
import { requireSetting } from '@/lib/env/require-setting';
import { guestTokenSchema } from '@/lib/schemas/guest-link';
import { setCookie } from './cookies';

/** A redirect that says only a path: behind a proxy the host is not ours to know. */
const goTo = (path: string, cookie?: string): Response => new Response(null, {
  status: 303, headers: { location: path, 'cache-control': 'no-store', 'referrer-policy': 'no-referrer', ...(cookie ? { 'set-cookie': cookie } : {}) },
});

/** Moves a guest link's token from the address into a cookie and goes on to its circuit; unknown or ended: to the start page. */
export async function openGuestLink(db: Database, token: string): Promise<Response> {
  const link = guestTokenSchema.safeParse(token).success ? await guestLinkByHash(db, tokenHash(token)) : undefined;
  if (!link) return goTo('/');
  return goTo(`/circuits/${link.circuitId}`, setCookie('guest', token, environment().secure));
}

/** Opens the demo circuit's last revision as a guest; where nothing is seeded it leads to the start page. */
export async function openDemo(db: Database): Promise<Response> {
  const demo = await demoCircuit(db);
  if (!demo) return goTo('/');
  const letter = await newestRevisionLetter(db, demo.circuitId);
  const token = demoToken(requireSetting('INTERNAL_SECRET'), demo.circuitId);
  return goTo(`/circuits/${demo.circuitId}${letter ? `/revisions/${letter}` : ''}`, setCookie('guest', token, environment().secure));
}
