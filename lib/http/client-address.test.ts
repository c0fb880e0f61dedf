import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { describe, expect, it } from 'vitest';
import { clientAddress } from './client-address';
import { noteSocketAddresses } from './socket-address';

const of = (forwarded: string | undefined, trusted: number) => clientAddress(new Headers(forwarded === undefined ? {} : { 'x-forwarded-for': forwarded }), trusted);

describe('clientAddress', () => {
  it.each([
    ['198.51.100.1', 0, '198.51.100.1'],
    ['6.6.6.6, 198.51.100.1', 0, '198.51.100.1'],
    ['6.6.6.6, 203.0.113.9, 10.0.0.1', 1, '203.0.113.9'],
    ['203.0.113.9, 10.0.0.1, 10.0.0.2', 2, '203.0.113.9'],
    ['10.0.0.1', 3, '10.0.0.1'],
    [undefined, 0, 'unknown'],
  ])('%s behind %i proxies is %s', (forwarded, trusted, address) => {
    expect(of(forwarded, trusted)).toBe(address);
  });

  it('believes the socket, whatever address a client gives itself', async () => {
    noteSocketAddresses();
    const server = createServer((request, response) => response.end(String(request.headers['x-forwarded-for'])));
    await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
    const { port } = server.address() as AddressInfo;
    const seen = await (await fetch(`http://127.0.0.1:${port}/`, { headers: { 'x-forwarded-for': '6.6.6.6' } })).text();
    await new Promise((resolve) => server.close(resolve));
    expect(seen).toBe('6.6.6.6, 127.0.0.1');
    expect(of(seen, 0)).toBe('127.0.0.1');
  });
});
