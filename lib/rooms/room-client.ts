import { environment } from '@/lib/env/environment';
import { realtimeInternalAddress } from '@/lib/env/realtime-address';
import { Problem } from '@/lib/errors/problem';
import { logger } from '@/lib/log/logger';
import {
  appendAnswerSchema, type AnnounceCall, type AppendAnswer, type AppendCall, type RevokeCall,
} from '@/realtime/internal-calls';

/** What web asks of the realtime process. Tests and the seed may bring a client of their own. */
export interface RoomClient {
  /** Appends one edit; answers after COMMIT. Throws `unavailable` when realtime cannot be reached. */
  append(call: AppendCall): Promise<AppendAnswer>;
  /** Tells open pages that rows changed. Never throws: the rows are committed, pages catch up when they next look. */
  announce(call: AnnounceCall): Promise<void>;
  /** Has sockets that a change of rights may concern checked at once. Never throws: rooms also poll. */
  revoke(call: RevokeCall): Promise<void>;
  /** Whether the process answers and its database is durable. */
  healthy(): Promise<boolean>;
}

const appendTimeout = 10_000;
const tellTimeout = 2_000;

/** The realtime process at `address`, spoken to with the shared secret. */
export function httpRoomClient(address: string, secret: string): RoomClient {
  const call = (path: string, body: unknown, timeout: number) => fetch(`${address}${path}`, {
    method: body === undefined ? 'GET' : 'POST',
    headers: { authorization: `Bearer ${secret}`, ...(body === undefined ? {} : { 'content-type': 'application/json' }) },
    ...(body === undefined ? {} : { body: JSON.stringify(body) }),
    signal: AbortSignal.timeout(timeout),
    cache: 'no-store',
  });
  const tell = async (path: string, body: AnnounceCall | RevokeCall) => {
    try {
      const response = await call(path, body, tellTimeout);
      if (!response.ok) logger('rooms').warn({ status: response.status, path }, 'realtime refused a notice');
    } catch (error) {
      logger('rooms').warn({ err: error, path }, 'realtime did not take a notice');
    }
  };
  return {
    append: async (body) => {
      try {
        const response = await call('/internal/append', body, appendTimeout);
        return appendAnswerSchema.parse(await response.json());
      } catch (error) {
        logger('rooms').error({ err: error, circuitId: body.circuitId }, 'realtime did not answer an edit');
        throw new Problem('unavailable', 'The sheet cannot be changed at the moment.', { retryAfter: 2 });
      }
    },
    announce: (body) => tell('/internal/announce', body),
    revoke: (body) => tell('/internal/revoke', body),
    healthy: async () => {
      try {
        return (await call('/internal/health', undefined, tellTimeout)).ok;
      } catch {
        return false;
      }
    },
  };
}

const shared = globalThis as typeof globalThis & { holdoffRooms?: RoomClient };

/** The process's realtime, from the environment. */
export function rooms(): RoomClient {
  if (!shared.holdoffRooms) {
    const env = environment();
    if (!env.INTERNAL_SECRET) throw new Error('INTERNAL_SECRET is not set.');
    shared.holdoffRooms = httpRoomClient(realtimeInternalAddress(env), env.INTERNAL_SECRET);
  }
  return shared.holdoffRooms;
}

/** Puts another client in the place of the one from the environment (tests and seed). */
export function replaceRooms(client: RoomClient | undefined): void {
  shared.holdoffRooms = client;
}
