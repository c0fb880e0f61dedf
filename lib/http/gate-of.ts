import type { z } from 'zod';
import type { Database } from '@/db/client';
import type { Caller, Person } from '@/lib/access/caller';
import {
  benchGate, circuitGate, messageGate, objectionGate, revisionGate, signOffGate, threadGate,
  type BenchAccess, type CircuitAccess, type MessageAccess, type RevisionAccess, type ThreadAccess,
} from '@/lib/access/gates';
import type { Standing } from '@/lib/access/may';
import { Problem } from '@/lib/errors/problem';
import { slugSchema } from '@/lib/schemas/bench';
import { idSchema } from '@/lib/schemas/text';
import type { Target } from './operation';

/** What a handler gets, by what its path names. */
export interface AccessByTarget {
  none: null;
  bench: BenchAccess;
  circuit: CircuitAccess;
  revision: RevisionAccess;
  'sign-off': RevisionAccess & { readonly signOff: string };
  objection: RevisionAccess & { readonly objection: string };
  thread: ThreadAccess;
  message: MessageAccess;
}

type Gate<T extends Target> = (db: Database, caller: Caller, params: Readonly<Record<string, string>>) => Promise<AccessByTarget[T]>;

/** What cannot be the name of anything is not there: it never reaches the database, whose columns take ids only. */
function named(schema: z.ZodType<string>, name: string | undefined): string {
  const parsed = schema.safeParse(name);
  if (!parsed.success) throw new Problem('not-found');
  return parsed.data;
}

const idOf = (params: Readonly<Record<string, string>>): string => named(idSchema, params['id']);

function personOf(caller: Caller): Caller & { person: Person } {
  if (caller.person === null) throw new Problem('not-signed-in');
  return { ...caller, person: caller.person };
}

const gates: { readonly [T in Target]: Gate<T> } = {
  none: async () => null,
  bench: (db, caller, params) => benchGate(db, personOf(caller), named(slugSchema, params['bench'])),
  circuit: (db, caller, params) => circuitGate(db, caller, idOf(params)),
  revision: (db, caller, params) => revisionGate(db, caller, idOf(params)),
  'sign-off': (db, caller, params) => signOffGate(db, caller, idOf(params)),
  objection: (db, caller, params) => objectionGate(db, caller, idOf(params)),
  thread: (db, caller, params) => threadGate(db, caller, idOf(params)),
  message: (db, caller, params) => messageGate(db, caller, idOf(params)),
};

/** Targets inside one circuit, where a guest link counts as somebody. */
const withinCircuit: ReadonlySet<Target> = new Set(['circuit', 'revision', 'sign-off', 'objection', 'thread', 'message']);

/** 401 when nobody is known, then whatever the target's gate says: branded ids and standing, or 404. */
export async function passGate<T extends Target>(
  target: T, who: 'anyone' | 'person', db: Database, caller: Caller, params: Readonly<Record<string, string>>,
): Promise<AccessByTarget[T]> {
  const known = caller.person !== null || (withinCircuit.has(target) && caller.link !== null);
  if (who !== 'anyone' && !known) throw new Problem('not-signed-in');
  return gates[target](db, caller, params);
}

export const standingFrom = (access: AccessByTarget[Target]): Standing | null => access?.standing ?? null;
