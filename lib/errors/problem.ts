import type { ProblemCode } from './codes';

/** Members a problem adds to its details (RFC 9457 extension members), all meant for the reader. */
export interface ProblemMembers {
  /** Fields that were wrong, by path in the input. */
  readonly errors?: readonly { readonly path: string; readonly message: string }[];
  readonly line?: number;
  readonly reason?: string;
  /** Requirements of the revision as they stood when the request was refused. */
  readonly requirements?: readonly unknown[];
  /** Designators, thread or objection ids that stand against the request. */
  readonly refs?: readonly string[];
  /** Seconds after which a repeat makes sense; sent as `Retry-After` too. */
  readonly retryAfter?: number;
}

/**
 * A refusal that was foreseen: it carries a closed code and words for people. Thrown by use cases, turned into
 * problem details at the edge. Anything else that is thrown is a fault of ours and answers `internal`.
 */
export class Problem extends Error {
  constructor(
    readonly code: ProblemCode,
    /** One sentence about this case: what was refused and why. Never holds secrets or internals. */
    readonly detail?: string,
    readonly members: ProblemMembers = {},
  ) {
    super(detail ?? code);
    this.name = 'Problem';
  }
}
