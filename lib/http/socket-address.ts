import { Server, type IncomingMessage } from 'node:http';

const shared = globalThis as typeof globalThis & { holdoffSocketAddress?: true };

/** Appends the address of a request's socket to its `X-Forwarded-For`, as a proxy does. */
export function appendSocketAddress({ headers, socket }: Pick<IncomingMessage, 'headers' | 'socket'>): void {
  const before = headers['x-forwarded-for'];
  const hops = [...(Array.isArray(before) ? before : [before ?? '']), socket.remoteAddress ?? 'unknown'];
  headers['x-forwarded-for'] = hops.filter((hop) => hop !== '').join(', ');
}

/**
 * Makes every HTTP server of this process note where a request came from before anything reads it. Next keeps the header that a
 * client sent, so that without this a client could give itself any address and step around the delays after wrong passwords.
 */
export function noteSocketAddresses(): void {
  if (shared.holdoffSocketAddress) return;
  shared.holdoffSocketAddress = true;
  const emit = Server.prototype.emit;
  Server.prototype.emit = function noting(this: Server, event: string | symbol, ...args: unknown[]): boolean {
    if (event === 'request') appendSocketAddress(args[0] as IncomingMessage);
    return Reflect.apply(emit, this, [event, ...args]) as boolean;
  };
}
