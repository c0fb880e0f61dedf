import { expect, it } from 'vitest';
import { contentSecurityPolicy } from './content-security-policy';

const base = { nonce: 'AAAA', realtime: 'ws://127.0.0.1:3001', secure: false, development: false };

it('lets scripts run by nonce only and nobody frame the page', () => {
  const policy = contentSecurityPolicy(base);
  expect(policy).toContain("script-src 'self' 'nonce-AAAA' 'strict-dynamic' 'wasm-unsafe-eval';");
  expect(policy).toContain("frame-ancestors 'none'");
  expect(policy).not.toContain("'unsafe-eval'");
  expect(policy).not.toContain('upgrade-insecure-requests');
});

it('allows connections to the room server, without its path', () => {
  expect(contentSecurityPolicy({ ...base, realtime: 'wss://rooms.example.org/a?b' })).toContain("connect-src 'self' wss://rooms.example.org;");
});

it('upgrades on https and loosens only in development', () => {
  expect(contentSecurityPolicy({ ...base, secure: true })).toContain('upgrade-insecure-requests');
  expect(contentSecurityPolicy({ ...base, development: true })).toContain("'unsafe-eval'");
});
