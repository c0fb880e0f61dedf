import { describe, expect, it } from 'vitest';
import { returnPath } from './return-path';

describe('returnPath', () => {
  it.each(['/benches/northgate', '/circuits/01J?at=36%20V#finding-x', '/'])('keeps a path of this site: %s', (path) => {
    expect(returnPath(path)).toBe(path);
  });

  it.each(['//evil.test', '/\\evil.test', 'https://evil.test/', 'javascript:alert(1)', '/a\nb', '/..//evil.test', '/./\\evil', '', null, undefined])(
    'falls back for %s', (path) => { expect(returnPath(path)).toBe('/benches'); },
  );
});
