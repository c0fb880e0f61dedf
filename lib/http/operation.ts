import type { z } from 'zod';
import type { Action } from '@/lib/access/rights';

/** What a path's first parameter names: decides which gate a call passes. */
export type Target = 'none' | 'bench' | 'circuit' | 'revision' | 'sign-off' | 'objection' | 'thread' | 'message';

/**
 * One call of the HTTP surface: the single source for its handler, its OpenAPI entry and its rows in the access matrix.
 */
export interface Operation<T extends Target = Target, Q extends z.ZodType = z.ZodType, B extends z.ZodType = z.ZodType> {
  readonly id: string;
  readonly method: 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';
  /** `{name}` parameters as OpenAPI writes them. */
  readonly path: string;
  readonly summary: string;
  /** `anyone` needs no session; `person` needs one; circuit-scoped reads also let a guest link through (the table of rights decides). */
  readonly who: 'anyone' | 'person';
  readonly target: T;
  /** Checked by `may` before the body is read; a use case that must look first (whose sign-off is it?) names several: any one suffices. */
  readonly actions?: readonly Action[];
  /** The act binds: the session must have signed in ≤ 12 h ago. */
  readonly fresh?: boolean;
  /** Runs the engine: 30 a minute and 2 at once for a person. */
  readonly engine?: boolean;
  readonly query?: Q;
  readonly body?: B;
  /** Bytes of body taken; 64 KiB unless stated. */
  readonly bodyLimit?: number;
  /** Answers by status; undefined for an empty answer. */
  readonly answers: Readonly<Partial<Record<200 | 201 | 204 | 503, z.ZodType | 'text' | 'empty'>>>;
}

/** Names an operation, keeping its types. */
export function operation<T extends Target, Q extends z.ZodType = z.ZodNever, B extends z.ZodType = z.ZodNever>(
  definition: Operation<T, Q, B>,
): Operation<T, Q, B> {
  return definition;
}
