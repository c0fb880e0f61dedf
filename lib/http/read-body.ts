import type { z } from 'zod';
import { Problem } from '@/lib/errors/problem';

const jsonType = /^application\/json(?:\s*;.*)?$/i;

/**
 * The body as `schema` has it. Only `application/json` is taken (415), at most `limit` bytes (413, counted while reading);
 * an empty body counts as `{}`, so that a call without a must may leave it out.
 */
export async function readBody<S extends z.ZodType>(request: Request, schema: S, limit: number): Promise<z.output<S>> {
  const bytes = await readLimited(request, limit);
  if (bytes.length === 0) return validated(schema, {});
  if (!jsonType.test(request.headers.get('content-type') ?? '')) throw new Problem('content-type');
  return validated(schema, parseJson(bytes));
}

async function readLimited(request: Request, limit: number): Promise<Uint8Array> {
  const tooLarge = () => new Problem('too-large', `At most ${Math.floor(limit / 1024)} KiB are taken here.`);
  if (Number(request.headers.get('content-length') ?? 0) > limit) throw tooLarge();
  const chunks: Uint8Array[] = [];
  let size = 0;
  const reader = request.body?.getReader();
  while (reader) {
    const { done, value } = await reader.read();
    if (done) break;
    size += value.length;
    if (size > limit) {
      await reader.cancel();
      throw tooLarge();
    }
    chunks.push(value);
  }
  return Buffer.concat(chunks, size);
}

/** Half of a character that takes two (`\ud800` in JSON): no text has it, and no database column keeps it. */
const halfCharacter = /\p{Surrogate}/u;

function parseJson(bytes: Uint8Array): unknown {
  let halved = false;
  const look = (key: string, value: unknown): unknown => {
    halved ||= halfCharacter.test(key) || (typeof value === 'string' && halfCharacter.test(value));
    return value;
  };
  let parsed: unknown;
  try {
    parsed = JSON.parse(new TextDecoder('utf-8', { fatal: true }).decode(bytes), look);
  } catch {
    throw new Problem('input-wrong', 'The body is not JSON in UTF-8.');
  }
  if (halved) throw new Problem('input-wrong', 'The body holds half a character.');
  return parsed;
}

/** `value` as `schema` has it, or 422 with every wrong field. */
export function validated<S extends z.ZodType>(schema: S, value: unknown): z.output<S> {
  const parsed = schema.safeParse(value);
  if (parsed.success) return parsed.data;
  const errors = parsed.error.issues.slice(0, 20).map((issue) => ({ path: issue.path.join('.'), message: issue.message }));
  const first = errors[0];
  throw new Problem('input-wrong', first && (first.path === '' ? first.message : `${first.path}: ${first.message}`), { errors });
}
