import { z } from 'zod';
import { codes } from '@/lib/errors/codes';
import type { Operation } from './operation';

type Json = Record<string, unknown>;

const problem = {
  type: 'object',
  required: ['type', 'title', 'status', 'detail', 'code', 'requestId'],
  properties: {
    type: { type: 'string' }, title: { type: 'string' }, status: { type: 'integer' }, detail: { type: 'string' },
    code: { type: 'string', enum: Object.keys(codes) }, requestId: { type: 'string' },
    errors: { type: 'array', items: { type: 'object', properties: { path: { type: 'string' }, message: { type: 'string' } } } },
    line: { type: 'integer' }, reason: { type: 'string' }, refs: { type: 'array', items: { type: 'string' } },
    requirements: { type: 'array', items: { type: 'object' } }, retryAfter: { type: 'integer' },
  },
};

/** JSON Schema of a zod schema; `io` says whether as it is sent or as it is answered. What has no JSON form is left open. */
function schemaOf(schema: z.ZodType, io: 'input' | 'output'): Json {
  const { $schema: _, ...rest } = z.toJSONSchema(schema, { io, unrepresentable: 'any', reused: 'inline' }) as Json;
  return rest;
}

function parametersOf(operation: Operation): Json[] {
  const inPath = [...operation.path.matchAll(/\{(\w+)\}/g)].map(([, name]) => ({ name, in: 'path', required: true, schema: { type: 'string' } }));
  const query = operation.query ? schemaOf(operation.query, 'input') : {};
  const required = new Set((query['required'] as string[] | undefined) ?? []);
  const inQuery = Object.entries((query['properties'] ?? {}) as Json).map(([name, schema]) => ({ name, in: 'query', required: required.has(name), schema }));
  const key = operation.method === 'GET' || operation.who === 'anyone' ? []
    : [{ name: 'Idempotency-Key', in: 'header', required: false, schema: { type: 'string', maxLength: 100 } }];
  return [...inPath, ...inQuery, ...key];
}

function answersOf(operation: Operation): Json {
  const answers = Object.entries(operation.answers).map(([status, schema]) => [status, {
    description: status === '201' ? 'Made' : status === '204' ? 'Done' : status === '503' ? 'Not all parts answer' : 'As asked',
    ...(schema === 'empty' ? {} : schema === 'text' ? { content: { 'text/plain': { schema: { type: 'string' } } } }
      : { content: { 'application/json': { schema: schemaOf(schema, 'output') } } }),
  }]);
  const refusal = { description: 'Refused', content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } } };
  return { ...Object.fromEntries(answers), default: refusal };
}

/** The surface as OpenAPI 3.1, from the very schemas that handlers parse with. */
export function openApi(surface: readonly Operation[]): Json {
  const paths: Record<string, Json> = {};
  for (const operation of surface) {
    const { id, method, path, summary, who, body } = operation;
    (paths[path] ??= {})[method.toLowerCase()] = {
      operationId: id, summary, parameters: parametersOf(operation),
      ...(who === 'anyone' ? { security: [] } : {}),
      ...(body ? { requestBody: { required: method !== 'DELETE', content: { 'application/json': { schema: schemaOf(body, 'input') } } } } : {}),
      responses: answersOf(operation),
    };
  }
  return {
    openapi: '3.1.0',
    info: { title: 'Holdoff', version: '1', description: 'Review it before you power it. Errors are problem details (RFC 9457) with a stable code.' },
    security: [{ session: [] }],
    paths,
    components: { securitySchemes: { session: { type: 'apiKey', in: 'cookie', name: 'holdoff-session' } }, schemas: { Problem: problem } },
  };
}
