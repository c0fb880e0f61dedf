import type { IncomingHttpHeaders } from 'node:http';
import { isLoopbackHost } from '@/lib/env/loopback';
import { subprotocol } from '@/realtime/limits';

export type UpgradeCheck =
  | { readonly ok: true; readonly roomId: string }
  | { readonly ok: false; readonly status: 400 | 403 | 404; readonly reason: string };

const roomPath = /^\/sheet\/([0-9A-HJKMNP-TV-Z]{26})$/;
const ipLiteral = /^(\d{1,3}(\.\d{1,3}){3}|\[[0-9a-f:.]+\])$/i;

function urlOf(text: string): URL | undefined {
  return URL.canParse(text) ? new URL(text) : undefined;
}

const portOf = (url: URL) => url.port || (url.protocol === 'https:' ? '443' : '80');

/**
 * True for pages of this site: the public address, or the page's port on the very host that this socket was opened to
 * when that host is a bare address (someone reached the machine by another of its addresses; a name could be rebound).
 */
export function isOwnOrigin(origin: string | undefined, host: string | undefined, publicUrl: string): boolean {
  const from = origin === undefined ? undefined : urlOf(origin);
  const site = new URL(publicUrl);
  if (!from) return false;
  if (from.origin === site.origin) return true;
  const own = urlOf(`http://${host ?? ''}`);
  const bare = isLoopbackHost(from.hostname) || ipLiteral.test(from.hostname);
  return bare && own?.hostname === from.hostname && portOf(from) === portOf(site) && from.protocol === site.protocol;
}

/** Whether a request may become a sheet socket at all. What it may do there is decided by its ticket. */
export function checkUpgrade(url: string | undefined, headers: IncomingHttpHeaders, publicUrl: string): UpgradeCheck {
  const roomId = roomPath.exec(url ?? '')?.[1];
  if (roomId === undefined) return { ok: false, status: 404, reason: 'no such room' };
  if (!isOwnOrigin(headers.origin, headers.host, publicUrl)) return { ok: false, status: 403, reason: 'foreign origin' };
  const offered = (headers['sec-websocket-protocol'] ?? '').split(',').map((name) => name.trim());
  if (!offered.includes(subprotocol)) return { ok: false, status: 400, reason: 'unknown subprotocol' };
  return { ok: true, roomId };
}
