/**
 * The client's network address. With `trusted` proxies in front, the entry of `X-Forwarded-For` that the outermost of them
 * wrote; without any, the last entry, which our own web server put there from the socket.
 */
export function clientAddress(headers: Pick<Headers, 'get'>, trusted: number): string {
  const entries = (headers.get('x-forwarded-for') ?? '').split(',').map((entry) => entry.trim()).filter((entry) => entry !== '');
  return entries.at(-Math.max(1, trusted)) ?? entries[0] ?? 'unknown';
}
