import type { z } from 'zod';
import { database, type Database } from '@/db/client';
import type { Caller, Person } from '@/lib/access/caller';
import { refuseStaleSession, refuseUnless } from '@/lib/access/refuse';
import { environment } from '@/lib/env/environment';
import { Problem } from '@/lib/errors/problem';
import { requestId as requestIdOf } from '@/lib/log/request-id';
import type { Answer } from './answer';
import { clientAddress } from './client-address';
import { readCookie } from './cookies';
import { passGate, standingFrom, type AccessByTarget } from './gate-of';
import { limits } from './limits';
import { once } from './once';
import type { Operation, Target } from './operation';
import { readBody, validated } from './read-body';
import { respond, respondProblem } from './respond';
import { refuseForeignOrigin } from './same-origin';
import { callerOf } from './who';

/** What a handler gets once everything before it has let the request through. */
export interface Call<T extends Target, Q extends z.ZodType, B extends z.ZodType> {
  readonly db: Database;
  readonly caller: Caller;
  /** The signed-in person. Reading it on a call that a guest makes throws 403. */
  readonly person: Person;
  readonly access: AccessByTarget[T];
  readonly query: z.output<Q>;
  readonly body: z.output<B>;
  readonly requestId: string;
  readonly address: string;
  readonly request: Request;
  /** Id of what this call makes, given with its idempotency key: a use case that finds it made answers a repeat. */
  readonly thing: string | undefined;
}

type RouteContext = { readonly params: Promise<Record<string, string>> };
const plainBodyLimit = 64 * 1024;
const nobody: Caller = { person: null, link: null };

/**
 * The one wrapper of route handlers. In this order: who (401), the thing (404), the right to it (403), its input (415, 413, 422),
 * then the handler, which may find that the state forbids it (409). Rate limits answer 429; anything unforeseen is logged and answers 500.
 */
export function serve<T extends Target, Q extends z.ZodType, B extends z.ZodType>(
  operation: Operation<T, Q, B>, handle: (call: Call<T, Q, B>) => Promise<Answer>,
): (request: Request, context: RouteContext) => Promise<Response> {
  return async (request, context) => {
    const requestId = requestIdOf(request.headers);
    try {
      return respond(await pass(operation, handle, request, await context.params, requestId), requestId);
    } catch (error) {
      return respondProblem(error, requestId);
    }
  };
}

async function pass<T extends Target, Q extends z.ZodType, B extends z.ZodType>(
  operation: Operation<T, Q, B>, handle: (call: Call<T, Q, B>) => Promise<Answer>,
  request: Request, params: Record<string, string>, requestId: string,
): Promise<Answer> {
  const env = environment();
  const db = database();
  const address = clientAddress(request.headers, env.TRUST_PROXY);
  const cookies = request.headers.get('cookie');
  // What anyone may read answers also while the database does not (health): nobody is looked up for it.
  const caller = operation.who === 'anyone' && operation.method === 'GET' ? nobody : await callerOf(db, cookies, env.secure);
  const person = caller.person;
  if (person) limits().person.take(person.id);
  else limits().stranger.take(address);

  const access = await passGate(operation.target, operation.who, db, caller, params);
  const byCookie = readCookie(cookies, 'session', env.secure) !== null || readCookie(cookies, 'guest', env.secure) !== null;
  refuseForeignOrigin(request, env.PUBLIC_URL, byCookie);
  const standing = standingFrom(access);
  if (standing && operation.actions) refuseUnless(operation.actions, standing);
  if (operation.fresh && person) refuseStaleSession(person);

  const url = new URL(request.url);
  const query = operation.query ? validated(operation.query, Object.fromEntries(url.searchParams)) : undefined;
  const body = operation.body ? await readBody(request, operation.body, operation.bodyLimit ?? plainBodyLimit) : undefined;
  const callFor = (thing?: string) => ({
    db, caller, access, query, body, requestId, address, request, thing,
    get person(): Person {
      if (!person) throw new Problem('not-allowed', 'A guest link lets you read, nothing else.');
      return person;
    },
  } as Call<T, Q, B>);
  const run = (thing?: string) => (operation.engine && person ? withEngine(person, () => handle(callFor(thing))) : handle(callFor(thing)));
  if (!person || operation.method === 'GET') return run();
  return once(db, person.id, request.headers.get('idempotency-key'), [operation.id, url.pathname, body ?? null], run);
}

async function withEngine(person: Person, work: () => Promise<Answer>): Promise<Answer> {
  limits().engine.take(person.id);
  return limits().atOnce.run(person.id, work);
}
