import { expect, it } from 'vitest';
import { clientAddress } from './client-address';

it.each([
  [0, undefined, '10.1.1.1'],
  [0, '6.6.6.6', '10.1.1.1'],
  [1, '6.6.6.6, 9.9.9.9', '9.9.9.9'],
  [2, '6.6.6.6, 8.8.8.8, 9.9.9.9', '8.8.8.8'],
  [3, '9.9.9.9', '9.9.9.9'],
  [1, '', '10.1.1.1'],
])('with %i trusted proxies and %s it is %s', (trusted, forwarded, address) => {
  expect(clientAddress('10.1.1.1', forwarded, trusted)).toBe(address);
});
