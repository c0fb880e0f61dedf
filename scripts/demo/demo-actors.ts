import type { Database } from '@/db/client';
import { benchGate, circuitGate, revisionGate, type CircuitAccess, type RevisionAccess } from '@/lib/access/gates';
import type { Caller, Person } from '@/lib/access/caller';
import { mintCircuit, mintPerson, mintRevision } from '@/lib/access/mint';
import { checkLive } from '@/lib/circuits/check-live';
import { postSheet } from '@/lib/circuits/post-circuit';
import type { Sheet } from '@/lib/document/records';
import type { Act } from '@/lib/review/act';
import { cutRevision } from '@/lib/review/cut-revision';
import { revisionHead } from '@/db/queries/revisions';
import { readLiveSheet } from '@/lib/rooms/live-sheet';
import { demoBench, demoPeople } from './demo-people';

/** The demo's people acting without sessions, each through the gates and use cases that everybody passes. */
export class DemoActors {
  constructor(private readonly db: Database, private readonly ids: ReadonlyMap<string, string>) {}

  id(key: string): string {
    const id = this.ids.get(key);
    if (id === undefined) throw new Error(`The demo has no ${key}.`);
    return id;
  }

  private caller(key: string): Caller & { person: Person } {
    const person = demoPeople.find((each) => each.key === key);
    return { person: { id: mintPerson(this.id(key)), name: person?.name ?? '', email: person?.email ?? '', session: { id: '', signedInAt: new Date() } }, link: null };
  }

  act(key: string): Act {
    return { db: this.db, person: this.caller(key).person, requestId: 'demo', now: new Date() };
  }

  async post(key: string, title: string, sheet: Sheet): Promise<string> {
    const access = await benchGate(this.db, this.caller(key), demoBench.slug);
    return (await postSheet({ ...this.act(key), person: { id: mintPerson(this.id(key)) } }, access, title, sheet)).value;
  }

  circuit(key: string, circuit: string): Promise<CircuitAccess> {
    return circuitGate(this.db, this.caller(key), circuit);
  }

  revision(key: string, revision: string): Promise<RevisionAccess> {
    return revisionGate(this.db, this.caller(key), revision);
  }

  async cut(key: string, circuit: string, note: string): Promise<string> {
    return (await cutRevision(this.act(key), await this.circuit(key, circuit), { note })).value;
  }

  async hash(revision: string): Promise<string> {
    return (await revisionHead(this.db, mintRevision(revision)))?.contentHash ?? '';
  }

  async partId(circuit: string, ref: string): Promise<string> {
    const { sheet } = await readLiveSheet(this.db, mintCircuit(circuit));
    return sheet.parts.find((part) => part.ref === ref)?.id ?? ref;
  }

  /** Checks the live sheet, so that lists know its stops. */
  async check(circuit: string): Promise<void> {
    await checkLive(this.db, await this.circuit('noor', circuit), {});
  }
}
