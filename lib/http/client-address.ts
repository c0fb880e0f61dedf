/**
 * The client's network address from `X-Forwarded-For`, whose last entry our own server wrote from the socket (`socket-address.ts`).
 * Each of `trusted` proxies in front wrote one entry before it; anything further left the client wrote and is not believed.
 */
export function clientAddress(headers: Pick<Headers, 'get'>, trusted: number): string {
  const hops = (headers.get('x-forwarded-for') ?? '').split(',').map((hop) => hop.trim()).filter((hop) => hop !== '');
  return hops.at(-1 - Math.min(trusted, hops.length - 1)) ?? 'unknown';
}
