import { describe, expect, it } from 'vitest';
import { codes, statusOf, type ProblemCode } from './codes';
import { Problem } from './problem';
import { problemDetails } from './problem-details';

describe('problem details', () => {
  it('carries code, status, words and the reference a person can quote', () => {
    const details = problemDetails(new Problem('deck-unreadable', 'Line 3: no value.', { line: 3, reason: 'no value' }), '01REQ');
    expect(details).toMatchObject({ type: '/problems/deck-unreadable', status: 422, code: 'deck-unreadable', line: 3, reason: 'no value', requestId: '01REQ' });
    expect(details.detail).toBe('Line 3: no value. Correct the line that is named; nothing was changed.');
  });

  it('says what to do even without a detail', () => {
    expect(problemDetails(new Problem('not-signed-in'), 'r').detail).toBe(codes['not-signed-in'].advice);
  });

  it('gives every code a 4xx or 5xx status, a title and advice that end in a full stop', () => {
    for (const [code, { title, advice }] of Object.entries(codes)) {
      expect(statusOf(code as ProblemCode), code).toBeGreaterThanOrEqual(400);
      expect(title, code).toMatch(/\.$/);
      expect(advice, code).toMatch(/\.$/);
    }
  });
});
