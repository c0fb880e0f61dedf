import { codes, statusOf } from './codes';
import type { Problem } from './problem';

/** Body of an error answer (RFC 9457), media type `application/problem+json`. */
export interface ProblemDetails {
  readonly type: string;
  readonly title: string;
  readonly status: number;
  readonly detail: string;
  readonly code: string;
  /** Reference a person can quote; the same id stands in our logs. */
  readonly requestId: string;
  readonly [member: string]: unknown;
}

/** Problem details of a foreseen refusal. `type` is a stable relative reference made of the code. */
export function problemDetails(problem: Problem, requestId: string): ProblemDetails {
  const { title, advice } = codes[problem.code];
  return {
    type: `/problems/${problem.code}`,
    title,
    status: statusOf(problem.code),
    detail: problem.detail === undefined ? advice : `${problem.detail} ${advice}`,
    code: problem.code,
    requestId,
    ...problem.members,
  };
}
