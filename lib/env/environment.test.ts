import { describe, expect, it } from 'vitest';
import { parseEnvironment } from './environment';
import { isLoopbackHost } from './loopback';
import { realtimeAddress, realtimeInternalAddress } from './realtime-address';

describe('parseEnvironment', () => {
  it('gives defaults that stay on this machine', () => {
    const env = parseEnvironment({});
    expect(env).toMatchObject({ HOST: '127.0.0.1', local: true, secure: false, TRUST_PROXY: 0 });
  });

  it('treats an empty variable as unset', () => {
    expect(parseEnvironment({ DATABASE_URL: '', SMTP_URL: '' })).toMatchObject({ DATABASE_URL: undefined, SMTP_URL: undefined });
  });

  it('names every wrong variable and repeats no value', () => {
    const attempt = () => parseEnvironment({ REALTIME_PORT: '99999', DATABASE_URL: 'postgres://u:topsecret@h/d' });
    expect(attempt).toThrow(/REALTIME_PORT/);
    expect(attempt).toThrow(/DATABASE_URL/);
    expect(attempt).not.toThrow(/topsecret/);
  });

  it('is not local and is secure on a public https address', () => {
    expect(parseEnvironment({ PUBLIC_URL: 'https://bench.example.org' })).toMatchObject({ local: false, secure: true });
  });

  it.each([['true', 1], ['false', 0], ['2', 2]])('reads TRUST_PROXY=%s', (word, hops) => {
    expect(parseEnvironment({ TRUST_PROXY: word }).TRUST_PROXY).toBe(hops);
  });
});

describe('isLoopbackHost', () => {
  it.each(['localhost', '127.0.0.1', '127.9.9.9', '::1', '[::1]', 'bench.localhost'])('takes %s', (name) => expect(isLoopbackHost(name)).toBe(true));
  it.each(['0.0.0.0', '10.0.0.1', '127.0.0.1.example.org', 'localhost.example.org', ''])('refuses %s', (name) => expect(isLoopbackHost(name)).toBe(false));
});

describe('realtimeAddress', () => {
  const env = parseEnvironment({ REALTIME_PORT: '4100', PUBLIC_URL: 'http://127.0.0.1:4000' });
  it('follows the host of the page', () => expect(realtimeAddress(env, 'localhost:4000')).toBe('ws://localhost:4100'));
  it('falls back to PUBLIC_URL for a host that is no host', () => expect(realtimeAddress(env, "a b;script-src *'")).toBe('ws://127.0.0.1:4100'));
  it('prefers REALTIME_URL', () => expect(realtimeAddress({ ...env, REALTIME_URL: 'wss://rooms.example.org/' }, 'x')).toBe('wss://rooms.example.org'));
  it('keeps internal calls on loopback', () => expect(realtimeInternalAddress(env)).toBe('http://127.0.0.1:4100'));
});
