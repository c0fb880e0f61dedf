import { describe, expect, it } from 'vitest';
import { openApi } from './open-api';
import { surface } from './operations/surface';

const description = openApi(surface) as { paths: Record<string, Record<string, { operationId: string; requestBody?: unknown; responses: Record<string, unknown> }>> };

describe('the API description', () => {
  it('has every operation once, under its path and method', () => {
    const ids = Object.values(description.paths).flatMap((methods) => Object.values(methods).map(({ operationId }) => operationId));
    expect(ids.sort()).toEqual(surface.map(({ id }) => id).sort());
    expect(new Set(ids).size).toBe(ids.length);
  });

  it('describes what a sign-off takes and gives', () => {
    const signing = description.paths['/api/revisions/{id}/sign-offs']?.['post'];
    expect(JSON.stringify(signing?.requestBody)).toContain('contentHash');
    expect(JSON.stringify(signing?.responses['201'])).toContain('holdPoint');
    expect(JSON.stringify(signing?.responses['default'])).toContain('Problem');
  });

  it('is plain JSON', () => {
    expect(JSON.parse(JSON.stringify(description))).toEqual(description);
  });
});
