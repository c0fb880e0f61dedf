import type { PersonId } from '@/db/authorized';

/** A signed-in person, proven by a session in force. */
export interface Person {
  readonly id: PersonId;
  readonly name: string;
  readonly email: string;
  readonly session: { readonly id: string; readonly signedInAt: Date };
}

/** Who makes a request: a person, a guest with a link, both, or nobody known. */
export interface Caller {
  readonly person: Person | null;
  /** A guest link in force that came with the request. */
  readonly link: { readonly id: string; readonly circuitId: string } | null;
}
