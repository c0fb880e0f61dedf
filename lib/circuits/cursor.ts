import type { z } from 'zod';
import { Problem } from '@/lib/errors/problem';

/** Where a page of a list ended, as the opaque text that callers hand back. */
export const encodeCursor = (place: readonly (string | number)[]): string => Buffer.from(JSON.stringify(place)).toString('base64url');

/** The place a cursor names, as `schema` has it; 422 for anything that is no cursor of ours. */
export function decodeCursor<S extends z.ZodType>(cursor: string, schema: S): z.output<S> {
  try {
    return schema.parse(JSON.parse(Buffer.from(cursor, 'base64url').toString()));
  } catch {
    throw new Problem('input-wrong', 'cursor: This is not a cursor from this list.', { errors: [{ path: 'cursor', message: 'Not a cursor from this list.' }] });
  }
}
