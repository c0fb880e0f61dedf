import { createHash, randomBytes } from 'node:crypto';
import { ulid } from 'ulid';
import type { Database } from '@/db/client';
import { createRoom } from '@/db/mutations/room-create';
import { circuitMakers, circuits, guestLinks } from '@/db/schema/circuits';
import { benches, memberships, people, sessions } from '@/db/schema/people';
import type { RoomActor } from '@/db/queries/room-grant';

const hour = 3_600_000;

export interface SheetPeople {
  readonly benchId: string;
  readonly circuitId: string;
  readonly otherCircuitId: string;
  readonly maker: PersonActor;
  readonly coMaker: PersonActor;
  readonly member: PersonActor;
  readonly mentor: PersonActor;
  readonly steward: PersonActor;
  /** Of another bench. */
  readonly stranger: PersonActor;
  readonly guest: Extract<RoomActor, { guestLinkId: string }>;
}

export interface PersonActor { readonly personId: string; readonly sessionId: string }

export async function addPerson(db: Database, name: string, benchId: string, role: 'member' | 'mentor' | 'steward'): Promise<PersonActor> {
  const personId = ulid();
  await db.insert(people).values({ id: personId, name, email: `${personId.toLowerCase()}@northgate.test`, passwordHash: 'none' });
  await db.insert(memberships).values({ benchId, personId, role });
  return { personId, sessionId: await addSession(db, personId) };
}

export async function addSession(db: Database, personId: string): Promise<string> {
  const id = createHash('sha256').update(randomBytes(16)).digest('hex');
  const now = Date.now();
  await db.insert(sessions).values({
    id, userId: personId, expiresAt: new Date(now + 12 * hour), signedInAt: new Date(now), endsAt: new Date(now + 720 * hour), lastUsedAt: new Date(now),
  });
  return id;
}

export async function addCircuit(db: Database, benchId: string, postedBy: string): Promise<string> {
  const id = ulid();
  await db.insert(circuits).values({ id, benchId, title: 'Coil driver', postedBy });
  await db.insert(circuitMakers).values({ id: ulid(), circuitId: id, personId: postedBy, standing: 1 });
  await createRoom(db, id);
  return id;
}

export async function addMaker(db: Database, circuitId: string, personId: string): Promise<void> {
  await db.insert(circuitMakers).values({ id: ulid(), circuitId, personId, standing: 1 });
}

/** A bench with a circuit and one person for each role there is. */
export async function addSheetPeople(db: Database): Promise<SheetPeople> {
  const benchId = ulid();
  const otherBench = ulid();
  await db.insert(benches).values([benchId, otherBench].map((id) => ({ id, slug: id.toLowerCase(), name: 'Northgate' })));
  const maker = await addPerson(db, 'Ines', benchId, 'member');
  const coMaker = await addPerson(db, 'Tomas', benchId, 'member');
  const member = await addPerson(db, 'Wen', benchId, 'member');
  const mentor = await addPerson(db, 'Adaeze', benchId, 'mentor');
  const steward = await addPerson(db, 'Jonas', benchId, 'steward');
  const stranger = await addPerson(db, 'Lena', otherBench, 'steward');
  const circuitId = await addCircuit(db, benchId, maker.personId);
  const otherCircuitId = await addCircuit(db, benchId, maker.personId);
  await addMaker(db, circuitId, coMaker.personId);
  const guestLinkId = ulid();
  await db.insert(guestLinks).values({
    id: guestLinkId, circuitId, madeBy: maker.personId, expiresAt: new Date(Date.now() + hour),
    tokenHash: createHash('sha256').update(randomBytes(16)).digest('hex'),
  });
  return { benchId, circuitId, otherCircuitId, maker, coMaker, member, mentor, steward, stranger, guest: { guestLinkId } };
}
