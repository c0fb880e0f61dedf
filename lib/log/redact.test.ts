import { pino } from 'pino';
import { describe, expect, it } from 'vitest';
import { redactedPaths, withoutAddresses } from './redact';
import { requestId } from './request-id';

describe('redaction', () => {
  it('keeps secrets out of the log at every depth used', () => {
    const lines: string[] = [];
    const log = pino({ redact: { paths: [...redactedPaths] } }, { write: (line: string) => void lines.push(line) });
    log.info({ token: 'A1', request: { cookie: 'A2' }, a: { b: { password: 'A3' } }, personId: 'kept' }, 'hello');
    expect(lines.join('')).not.toMatch(/A[123]/);
    expect(lines.join('')).toContain('kept');
  });

  it('takes addresses out of text', () => {
    expect(withoutAddresses("Duplicate entry 'ines@northgate.test' for key 'email'")).toBe("Duplicate entry '[address]' for key 'email'");
  });
});

describe('requestId', () => {
  it('keeps a well-formed id and replaces anything else', () => {
    const id = '01ARZ3NDEKTSV4RRFFQ69G5FAV';
    expect(requestId(new Headers({ 'x-request-id': id }))).toBe(id);
    expect(requestId(new Headers({ 'x-request-id': 'x"} injected' }))).toMatch(/^[0-9A-Z]{26}$/);
  });
});
