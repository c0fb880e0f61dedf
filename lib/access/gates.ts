import type { BenchId, CircuitId, MessageId, RevisionId, ThreadId } from '@/db/authorized';
import type { Executor } from '@/db/client';
import { benchRole } from '@/db/queries/people';
import {
  circuitFacts, circuitOfRevision, contributesTo, partIn, placeOfMessage, placeOfObjection, placeOfSignOff, placeOfThread, standingOf,
} from '@/db/queries/standing';
import { Problem } from '@/lib/errors/problem';
import type { Caller, Person } from './caller';
import type { Standing } from './may';
import { mintBench, mintCircuit, mintMessage, mintRevision, mintThread } from './mint';

/** What every gate answers with: branded ids, and what the caller is to the thing. Nothing there, or not to be seen: 404. */
export interface BenchAccess { readonly bench: BenchId; readonly slug: string; readonly name: string; readonly standing: Standing }
export interface CircuitAccess {
  readonly circuit: CircuitId;
  readonly bench: BenchId;
  readonly slug: string;
  readonly archived: boolean;
  readonly postedBy: string;
  readonly standing: Standing;
}
export interface RevisionAccess extends CircuitAccess { readonly revision: RevisionId }
export interface ThreadAccess extends CircuitAccess { readonly thread: ThreadId; readonly mustAnswer: boolean }
export interface MessageAccess extends CircuitAccess { readonly thread: ThreadId; readonly message: MessageId }

const missing = (): never => { throw new Problem('not-found'); };

export async function benchGate(db: Executor, caller: Caller & { person: Person }, slug: string): Promise<BenchAccess> {
  const found = await benchRole(db, slug, caller.person.id) ?? missing();
  return { bench: mintBench(found.id), slug: found.slug, name: found.name, standing: { role: found.role } };
}

/** People of the bench, else a guest whose link is for this very circuit. */
export async function circuitGate(db: Executor, caller: Caller, circuitId: string): Promise<CircuitAccess> {
  const facts = await circuitFacts(db, circuitId) ?? missing();
  const place = {
    circuit: mintCircuit(facts.id), bench: mintBench(facts.benchId), slug: facts.bench,
    archived: facts.archivedAt !== null, postedBy: facts.postedBy,
  };
  const person = caller.person ? await standingOf(db, facts.id, caller.person.id) : undefined;
  if (caller.person && person) {
    return { ...place, standing: { role: person.role, maker: person.makerRow !== null, poster: facts.postedBy === caller.person.id } };
  }
  if (caller.link?.circuitId === facts.id) return { ...place, standing: { role: 'guest' } };
  return missing();
}

export async function revisionGate(db: Executor, caller: Caller, revisionId: string): Promise<RevisionAccess> {
  const circuitId = await circuitOfRevision(db, revisionId) ?? missing();
  const access = await circuitGate(db, caller, circuitId);
  const part = caller.person && access.standing.role !== 'guest' ? await partIn(db, revisionId, caller.person.id) : {};
  return { ...access, revision: mintRevision(revisionId), standing: { ...access.standing, ...part } };
}

export async function signOffGate(db: Executor, caller: Caller, id: string): Promise<RevisionAccess & { readonly signOff: string }> {
  const place = await placeOfSignOff(db, id) ?? missing();
  const access = await revisionGate(db, caller, place.revisionId);
  return { ...access, signOff: id, standing: { ...access.standing, author: caller.person?.id === place.by } };
}

export async function objectionGate(db: Executor, caller: Caller, id: string): Promise<RevisionAccess & { readonly objection: string }> {
  const place = await placeOfObjection(db, id) ?? missing();
  const access = await revisionGate(db, caller, place.revisionId);
  return { ...access, objection: id, standing: { ...access.standing, author: caller.person?.id === place.by } };
}

export async function threadGate(db: Executor, caller: Caller, id: string): Promise<ThreadAccess> {
  const place = await placeOfThread(db, id) ?? missing();
  const access = await circuitGate(db, caller, place.circuitId);
  const contributor = caller.person ? await contributesTo(db, place.circuitId, caller.person.id) : undefined;
  const standing = { ...access.standing, author: caller.person?.id === place.by, contributor };
  return { ...access, thread: mintThread(id), mustAnswer: place.mustAnswer, standing };
}

export async function messageGate(db: Executor, caller: Caller, id: string): Promise<MessageAccess> {
  const place = await placeOfMessage(db, id) ?? missing();
  const access = await circuitGate(db, caller, place.circuitId);
  return { ...access, thread: mintThread(place.threadId), message: mintMessage(id), standing: { ...access.standing, author: caller.person?.id === place.by } };
}
