import { Problem } from '@/lib/errors/problem';

interface OriginRequest {
  readonly method: string;
  readonly headers: Pick<Headers, 'get'>;
}

/**
 * Refuses a write that did not come from our own pages: `Origin` must name the host and port of `Host` or of
 * `publicUrl`, and `Sec-Fetch-Site`, if sent, must be `same-origin`. A write that carries one of our cookies must have an
 * `Origin`; one without cookies (signing in from a script) may leave it out, as no browser does.
 */
export function refuseForeignOrigin(request: OriginRequest, publicUrl: string, byCookie: boolean): void {
  if (request.method === 'GET' || request.method === 'HEAD') return;
  const site = request.headers.get('sec-fetch-site');
  if (site !== null && site !== 'same-origin') throw new Problem('cross-origin');
  const origin = request.headers.get('origin');
  if (origin === null) {
    if (byCookie) throw new Problem('cross-origin', 'The request does not say where it comes from.');
    return;
  }
  const host = hostOf(origin);
  if (host === null || (host !== request.headers.get('host')?.toLowerCase() && host !== hostOf(publicUrl))) throw new Problem('cross-origin');
}

function hostOf(address: string): string | null {
  return URL.canParse(address) && /^https?:/i.test(address) ? new URL(address).host : null;
}
