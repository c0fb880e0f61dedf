import { benchGate, circuitGate } from '@/lib/access/gates';
import type { Caller, Person } from '@/lib/access/caller';
import { mintPerson } from '@/lib/access/mint';
import { postSheet } from '@/lib/circuits/post-circuit';
import type { Sheet } from '@/lib/document/records';
import { editSheet } from '@/lib/rooms/edit-sheet';
import type { ApiWorld, TestBench, TestPerson } from './api-world';
import { reviewedSheet, withValue } from './drawn-circuit';

/** The people of a bench as the access table knows them, with one circuit that `maker` posted. */
export interface BenchWithCircuit {
  readonly bench: TestBench;
  readonly circuit: string;
  readonly maker: TestPerson;
  readonly member: TestPerson;
  readonly mentor: TestPerson;
  readonly secondMentor: TestPerson;
  readonly steward: TestPerson;
  /** Steward of another bench. */
  readonly stranger: TestPerson;
}

/** The person behind a test person, acting without a session. */
export const personOf = ({ id, name, email }: TestPerson): Person => ({ id: mintPerson(id), name, email, session: { id: '', signedInAt: new Date() } });
export const callerOf = (person: TestPerson): Caller & { person: Person } => ({ person: personOf(person), link: null });

export async function benchWithCircuit(world: ApiWorld, sheet: Sheet | undefined = reviewedSheet): Promise<BenchWithCircuit> {
  const [maker, member, mentor, secondMentor, steward, stranger] = await Promise.all(
    ['Ines Okafor', 'Tomasz Hale', 'Ruth Adeyemi', 'Marek Solano', 'Noor Castellan', 'Lena Brandt'].map((name) => world.person(name)),
  ) as [TestPerson, TestPerson, TestPerson, TestPerson, TestPerson, TestPerson];
  const bench = await world.bench(steward, [[maker, 'member'], [member, 'member'], [mentor, 'mentor'], [secondMentor, 'mentor']]);
  await world.bench(stranger);
  return { bench, circuit: await postAs(world, bench, maker, sheet), maker, member, mentor, secondMentor, steward, stranger };
}

/** Posts a circuit through its use case, drawn already. */
export async function postAs(world: ApiWorld, bench: TestBench, maker: TestPerson, sheet: Sheet | undefined = reviewedSheet): Promise<string> {
  const access = await benchGate(world.db, callerOf(maker), bench.slug);
  return (await postSheet({ db: world.db, person: { id: mintPerson(maker.id) }, requestId: 'test', now: new Date() }, access, 'Bench circuit', sheet)).value;
}

/** Changes R1 as one edit of a person; answers the seq. */
export async function changeValue(world: ApiWorld, person: TestPerson, circuit: string, ohms: number): Promise<number> {
  const access = await circuitGate(world.db, callerOf(person), circuit);
  return editSheet(world.db, access.circuit, { id: mintPerson(person.id) }, (sheet) => withValue(sheet, ohms));
}
