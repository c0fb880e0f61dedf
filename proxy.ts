import { NextResponse, type NextRequest } from 'next/server';
import { contentSecurityPolicy } from '@/lib/env/content-security-policy';
import { environment } from '@/lib/env/environment';
import { realtimeAddress } from '@/lib/env/realtime-address';
import { themeScript } from '@/components/shell/theme-script';
import { ownPage, ownRequestHeader } from '@/lib/http/own-page';
import { withoutScripts } from '@/lib/http/without-scripts';
import { requestId, requestIdHeader } from '@/lib/log/request-id';

/** One year, for every host below PUBLIC_URL's (RFC 6797). */
const strictTransport = 'max-age=31536000; includeSubDomains';

/**
 * The landing page is read, not used: people get it without the runtime's scripts, with the one line its toggle needs.
 * Client-side navigation and development get the page as it is, and so does everybody when it cannot be fetched.
 */
function wantsBareLanding(request: NextRequest, mode: string): boolean {
  const { headers, method, nextUrl } = request;
  return mode === 'production' && method === 'GET' && nextUrl.pathname === '/' && !headers.has('rsc') && !headers.has(ownRequestHeader)
    && (headers.get('accept') ?? '').includes('text/html');
}

/** Gives every request an id and every page a nonce, and sets the headers that depend on the request or the environment. */
export async function proxy(request: NextRequest): Promise<NextResponse> {
  const env = environment();
  const nonce = btoa(String.fromCharCode(...crypto.getRandomValues(new Uint8Array(16))));
  const policy = contentSecurityPolicy({
    nonce,
    realtime: realtimeAddress(env, request.headers.get('host')),
    secure: env.secure,
    development: env.NODE_ENV === 'development',
  });
  const id = requestId(env.TRUST_PROXY > 0 ? request.headers : new Headers());
  const headers = new Headers(request.headers);
  headers.set('content-security-policy', policy);
  headers.set('x-nonce', nonce);
  headers.set(requestIdHeader, id);

  const bare = wantsBareLanding(request, env.NODE_ENV) ? await ownPage('/', request.headers, env) : null;
  const response = bare === null
    ? NextResponse.next({ request: { headers } })
    : new NextResponse(withoutScripts(bare, themeScript, nonce), { headers: { 'Content-Type': 'text/html; charset=utf-8', 'Cache-Control': 'private, no-store', Vary: 'Cookie' } });
  response.headers.set('Content-Security-Policy', policy);
  response.headers.set('X-Request-Id', id);
  if (env.secure) response.headers.set('Strict-Transport-Security', strictTransport);
  return response;
}

/** Everything but built files and the engine, whose headers `next.config.mjs` sets. */
export const config = { matcher: ['/((?!_next/static|_next/image|vendor/).*)'] };
