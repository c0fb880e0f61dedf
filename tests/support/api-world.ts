import { ulid } from 'ulid';
import { closeDatabase, database, type Database } from '@/db/client';
import { inTransaction } from '@/db/transaction';
import { insertBench, insertMember, insertPerson } from '@/db/mutations/benches';
import { startSession } from '@/lib/auth/session';
import { replaceRooms } from '@/lib/rooms/room-client';
import type { Operation } from '@/lib/http/operation';
import type { BenchRole } from '@/lib/schemas/bench';
import { freshDatabase } from './database';
import { inProcessRooms, type InProcessRooms } from '../../scripts/demo/in-process-rooms';

export interface TestPerson { readonly id: string; readonly name: string; readonly email: string; readonly cookie: string }
export interface TestBench { readonly id: string; readonly slug: string }

export interface CallOptions {
  readonly params?: Readonly<Record<string, string>>;
  readonly query?: Record<string, string>;
  readonly body?: unknown;
  readonly headers?: Record<string, string>;
}
export interface CallAnswer<T = Record<string, unknown>> { readonly status: number; readonly body: T; readonly headers: Headers }

const origin = 'http://127.0.0.1:3000';

/** Route handlers called in this process on a real MariaDB, with the real rooms: everything but sockets and pages. */
export class ApiWorld {
  private constructor(readonly db: Database, readonly rooms: InProcessRooms) {}

  static async start(): Promise<ApiWorld> {
    Object.assign(process.env, { DATABASE_URL: await freshDatabase(), PUBLIC_URL: origin, INTERNAL_SECRET: 'x'.repeat(32), LOG_LEVEL: process.env['TEST_LOG'] ?? 'silent', NODE_ENV: 'test' });
    const db = database();
    const rooms = inProcessRooms(db);
    replaceRooms(rooms);
    return new ApiWorld(db, rooms);
  }

  async stop(): Promise<void> {
    await this.rooms.close();
    replaceRooms(undefined);
    await closeDatabase();
  }

  /** A person with a session in force; `signedInAt` may lie back. The password is not hashed: signing in is tested elsewhere. */
  async person(name: string, signedInAt = new Date()): Promise<TestPerson> {
    const id = ulid();
    const email = `${id.toLowerCase()}@northgate.test`;
    await inTransaction(this.db, (tx) => insertPerson(tx, { id, email, name, passwordHash: 'none' }));
    return { id, name, email, cookie: await this.cookieFor(id, signedInAt) };
  }

  async cookieFor(personId: string, signedInAt = new Date()): Promise<string> {
    return `holdoff-session=${await startSession(this.db, personId, 'vitest', signedInAt)}`;
  }

  async bench(steward: TestPerson, members: readonly (readonly [TestPerson, BenchRole])[] = []): Promise<TestBench> {
    const bench = { id: ulid(), slug: ulid().toLowerCase(), name: 'Northgate Makerspace Power Lab' };
    await inTransaction(this.db, async (tx) => {
      await insertBench(tx, bench, steward.id);
      for (const [person, role] of members) await insertMember(tx, bench.id, person.id, role);
    });
    return bench;
  }

  /** Calls an operation through its route file. `who` is a person, a cookie header, or nobody. */
  async call<T = Record<string, never>>(who: TestPerson | string | null, operation: Operation, { params = {}, query, body, headers = {} }: CallOptions = {}): Promise<CallAnswer<T>> {
    const path = operation.path.replace(/\{(\w+)\}/g, (_, name: string) => encodeURIComponent(params[name] ?? ''));
    const url = `${origin}${path}${query ? `?${new URLSearchParams(query)}` : ''}`;
    const cookie = typeof who === 'string' ? who : who?.cookie;
    const request = new Request(url, {
      method: operation.method,
      headers: {
        host: new URL(origin).host, origin, 'sec-fetch-site': 'same-origin', ...(cookie ? { cookie } : {}),
        ...(body === undefined ? {} : { 'content-type': 'application/json' }), ...headers,
      },
      ...(body === undefined ? {} : { body: typeof body === 'string' ? body : JSON.stringify(body) }),
    });
    const handler = await handlerOf(operation);
    const answer = await handler(request, { params: Promise.resolve(params) });
    const text = await answer.text();
    const json = /json/.test(answer.headers.get('content-type') ?? '');
    return { status: answer.status, body: (json ? JSON.parse(text) : text) as T, headers: answer.headers };
  }
}

type Handler = (request: Request, context: { params: Promise<Record<string, string>> }) => Promise<Response>;
const routes = import.meta.glob<Record<string, Handler>>('/app/api/**/route.ts');

/** Path of the route file that answers an operation. */
export const routeFileOf = ({ path }: Operation): string => `/app${path.replace(/\{(\w+)\}/g, '[$1]')}/route.ts`;
export const routeFiles = (): string[] => Object.keys(routes);

export async function handlerOf(operation: Operation): Promise<Handler> {
  const load = routes[routeFileOf(operation)];
  const handler = load && (await load())[operation.method];
  if (!handler) throw new Error(`${operation.id} has no handler: ${operation.method} in ${routeFileOf(operation)}`);
  return handler;
}
