import type { IncomingMessage, RequestListener, ServerResponse } from 'node:http';
import { announceCallSchema, revokeCallSchema, type RevokeCall } from '@/realtime/internal-calls';
import type { RoomContext } from '../room/room-context';
import type { RoomRegistry } from '../room/room-registry';
import { answerAppend } from './append-call';
import { readJson, sendJson } from './json-body';
import { carriesSecret } from './shared-secret';

export interface InternalServer {
  readonly context: RoomContext;
  readonly rooms: RoomRegistry;
  readonly secret: string;
  /** Checks at once the sockets that a change of rights may concern. */
  readonly recheck: (call: RevokeCall) => Promise<void>;
  /** True when the database answers and keeps its promise of durability. */
  readonly healthy: () => Promise<boolean>;
  readonly connections: () => number;
}

/** Plain HTTP of the realtime process: readiness, and calls from web that carry the shared secret. */
export function internalListener(server: InternalServer): RequestListener {
  return (request, response) => {
    answer(server, request, response).catch((error: unknown) => {
      server.context.log.error({ err: error }, 'an internal call failed');
      if (!response.headersSent) sendJson(response, 500);
    });
  };
}

async function answer(server: InternalServer, request: IncomingMessage, response: ServerResponse): Promise<void> {
  const path = request.url?.split('?')[0];
  if (request.method === 'GET' && path === '/ready') return sendJson(response, (await server.healthy()) ? 200 : 503, {});
  // Browsers send Origin and proxies say for whom they ask; web does neither.
  const outside = request.headers.origin !== undefined || request.headers['x-forwarded-for'] !== undefined;
  if (!path?.startsWith('/internal/') || outside) return sendJson(response, 404);
  if (!carriesSecret(request.headers.authorization, server.secret)) return sendJson(response, 401);

  if (request.method === 'GET' && path === '/internal/health') {
    const healthy = await server.healthy();
    return sendJson(response, healthy ? 200 : 503, { database: healthy, rooms: server.rooms.size, connections: server.connections() });
  }
  if (request.method !== 'POST') return sendJson(response, 405);
  const body = await readJson(request);
  switch (path) {
    case '/internal/append': {
      const result = await answerAppend(server.context, server.rooms, body);
      return sendJson(response, result.status, result.body);
    }
    case '/internal/announce': {
      const call = announceCallSchema.safeParse(body);
      if (!call.success) return sendJson(response, 400);
      (await server.rooms.openNow(call.data.circuitId))?.fan.event(call.data.topic, call.data.data);
      return sendJson(response, 204);
    }
    case '/internal/revoke': {
      const call = revokeCallSchema.safeParse(body);
      if (!call.success) return sendJson(response, 400);
      await server.recheck(call.data);
      return sendJson(response, 204);
    }
    default: return sendJson(response, 404);
  }
}
