import type { Environment } from './environment';

/**
 * The room server's address for a browser that reached the page at `host` (a `Host` header, port included):
 * REALTIME_URL, or plain `ws:` on REALTIME_PORT of the page's own host.
 */
export function realtimeAddress(env: Pick<Environment, 'REALTIME_URL' | 'REALTIME_PORT' | 'PUBLIC_URL'>, host: string | null): string {
  if (env.REALTIME_URL) return env.REALTIME_URL.replace(/\/$/, '');
  const name = host !== null && /^(\[[0-9a-f:.]+\]|[a-z0-9.-]+)(:\d+)?$/i.test(host) ? new URL(`http://${host}`).hostname : new URL(env.PUBLIC_URL).hostname;
  return `ws://${name}:${env.REALTIME_PORT}`;
}

/** Where web sends its internal calls to realtime. */
export function realtimeInternalAddress(env: Pick<Environment, 'REALTIME_INTERNAL_URL' | 'REALTIME_PORT'>): string {
  return (env.REALTIME_INTERNAL_URL ?? `http://127.0.0.1:${env.REALTIME_PORT}`).replace(/\/$/, '');
}
