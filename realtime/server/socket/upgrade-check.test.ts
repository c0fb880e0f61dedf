import { expect, it } from 'vitest';
import { isOwnOrigin } from './upgrade-check';

const loopback = 'http://127.0.0.1:3000';
const site = 'https://bench.northgate.test';

it.each([
  [loopback, 'http://127.0.0.1:3000', '127.0.0.1:3001', true],
  [loopback, 'http://localhost:3000', 'localhost:3001', true],
  [loopback, 'http://192.168.4.20:3000', '192.168.4.20:3001', true],
  [loopback, 'http://192.168.4.20:3000', '192.168.4.21:3001', false],
  [loopback, 'http://rebound.test:3000', 'rebound.test:3001', false],
  [loopback, 'http://127.0.0.1:8080', '127.0.0.1:3001', false],
  [site, 'https://bench.northgate.test', 'rooms.northgate.test', true],
  [site, 'http://bench.northgate.test', 'bench.northgate.test', false],
  [site, 'https://bench.northgate.test.elsewhere.test', 'bench.northgate.test', false],
  [site, 'null', 'bench.northgate.test', false],
  [site, undefined, 'bench.northgate.test', false],
])('site %s: a page at %s on a socket to %s', (publicUrl, origin, host, own) => {
  expect(isOwnOrigin(origin, host, publicUrl)).toBe(own);
});
