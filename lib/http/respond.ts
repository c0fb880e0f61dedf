import { isDeadlock, isOutage } from '@/db/errors';
import { Problem } from '@/lib/errors/problem';
import { problemDetails } from '@/lib/errors/problem-details';
import { logger } from '@/lib/log/logger';
import type { Answer } from './answer';

const always = { 'cache-control': 'no-store', 'x-content-type-options': 'nosniff' };

/** The response of an answer: JSON unless the body is text with its own media type. */
export function respond(answer: Answer, requestId: string): Response {
  const headers = new Headers({ ...always, 'x-request-id': requestId, ...answer.headers });
  if (answer.status === 204 || answer.body === undefined) return new Response(null, { status: answer.status, headers });
  if (typeof answer.body === 'string') return new Response(answer.body, { status: answer.status, headers });
  headers.set('content-type', 'application/json; charset=utf-8');
  return new Response(JSON.stringify(answer.body), { status: answer.status, headers });
}

/** Problem details of whatever was thrown. What was not foreseen is logged with the reference a person can quote, and says no more. */
export function respondProblem(error: unknown, requestId: string): Response {
  const problem = foreseen(error);
  if (problem.code === 'internal' || problem.code === 'unavailable') logger('http').error({ err: error, requestId }, 'A request failed');
  const details = problemDetails(problem, requestId);
  const headers = new Headers({ ...always, 'x-request-id': requestId, 'content-type': 'application/problem+json; charset=utf-8' });
  if (problem.members.retryAfter !== undefined) headers.set('retry-after', String(problem.members.retryAfter));
  return new Response(JSON.stringify(details), { status: details.status, headers });
}

function foreseen(error: unknown): Problem {
  if (error instanceof Problem) return error;
  return isOutage(error) || isDeadlock(error) ? new Problem('unavailable', undefined, { retryAfter: 2 }) : new Problem('internal');
}
