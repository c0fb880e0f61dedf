import { describe, expect, it } from 'vitest';
import { refuseForeignOrigin } from './same-origin';

const write = (headers: Record<string, string>) => ({ method: 'POST', headers: new Headers({ host: 'bench.test:8080', ...headers }) });
const publicUrl = 'https://holdoff.test';

describe('refuseForeignOrigin', () => {
  it.each([
    [{ origin: 'http://bench.test:8080' }, true],
    [{ origin: 'https://holdoff.test' }, true],
    [{ origin: 'http://bench.test:8080', 'sec-fetch-site': 'same-origin' }, true],
    [{}, false],
  ])('passes %o', (headers, byCookie) => {
    expect(() => refuseForeignOrigin(write(headers), publicUrl, byCookie)).not.toThrow();
  });

  it.each([
    [{}, true],
    [{ origin: 'null' }, true],
    [{ origin: 'http://bench.test:8081' }, true],
    [{ origin: 'http://evil.test' }, false],
    [{ origin: 'http://holdoff.test.evil.test' }, true],
    [{ origin: 'http://bench.test:8080', 'sec-fetch-site': 'same-site' }, true],
    [{ origin: 'http://bench.test:8080', 'sec-fetch-site': 'none' }, true],
  ])('refuses %o', (headers, byCookie) => {
    expect(() => refuseForeignOrigin(write(headers), publicUrl, byCookie)).toThrowError(expect.objectContaining({ code: 'cross-origin' }));
  });

  it('leaves reading alone', () => {
    expect(() => refuseForeignOrigin({ method: 'GET', headers: new Headers({ origin: 'http://evil.test' }) }, publicUrl, true)).not.toThrow();
  });
});
