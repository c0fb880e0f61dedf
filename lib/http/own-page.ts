import type { Environment } from '@/lib/env/environment';

/** Marks a request that this process makes to itself. */
export const ownRequestHeader = 'x-holdoff-own';

const everywhere: ReadonlySet<string> = new Set(['0.0.0.0', '::', '']);

/**
 * One of our own pages as this process renders it, fetched over loopback (never from the address a client names); null when
 * it does not answer with a page.
 */
export async function ownPage(path: string, headers: Headers, env: Pick<Environment, 'HOST' | 'PORT'>): Promise<string | null> {
  const host = everywhere.has(env.HOST) ? '127.0.0.1' : env.HOST.includes(':') ? `[${env.HOST}]` : env.HOST;
  const asked = new Headers({ accept: 'text/html', [ownRequestHeader]: '1' });
  const cookie = headers.get('cookie');
  if (cookie) asked.set('cookie', cookie);
  try {
    const answer = await fetch(`http://${host}:${env.PORT}${path}`, { headers: asked, redirect: 'manual', signal: AbortSignal.timeout(5_000) });
    return answer.ok && answer.headers.get('content-type')?.startsWith('text/html') ? await answer.text() : null;
  } catch {
    return null;
  }
}
