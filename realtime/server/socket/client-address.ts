/**
 * The address that the outermost trusted proxy saw. `trusted` proxies each appended one address to `X-Forwarded-For`;
 * anything further left was written by the client and is not believed.
 */
export function clientAddress(remoteAddress: string | undefined, forwardedFor: string | undefined, trusted: number): string {
  const hops = [...(forwardedFor ?? '').split(',').map((hop) => hop.trim()).filter((hop) => hop !== ''), remoteAddress ?? ''];
  return hops.at(-1 - Math.min(trusted, hops.length - 1)) ?? '';
}
