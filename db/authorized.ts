declare const authorized: unique symbol;

/** An id that a gate of `lib/access` has let through: queries and mutations of a noun take nothing else. */
type Authorized<Noun extends string> = string & { readonly [authorized]: Noun };

export type BenchId = Authorized<'bench'>;
export type CircuitId = Authorized<'circuit'>;
export type RevisionId = Authorized<'revision'>;
export type ThreadId = Authorized<'thread'>;
export type MessageId = Authorized<'message'>;
export type PersonId = Authorized<'person'>;
