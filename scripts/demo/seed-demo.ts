import { ulid } from 'ulid';
import type { Database } from '@/db/client';
import { insertBench, insertMember, insertPerson } from '@/db/mutations/benches';
import { insertGuestLink } from '@/db/mutations/guest-links';
import { writeAudit } from '@/db/mutations/audit';
import { draw, type Drawing } from '@/db/seed/draw';
import { fanDriver } from '@/db/seed/fan-driver';
import { inductionHeaterDriver } from '@/db/seed/induction-heater-driver';
import { relayDriver } from '@/db/seed/relay-driver';
import { spotWelderTrigger } from '@/db/seed/spot-welder-trigger';
import { inTransaction } from '@/db/transaction';
import { demoToken } from '@/lib/auth/demo-token';
import { hashPassword } from '@/lib/auth/password';
import { tokenHash } from '@/lib/auth/token';
import { askForChanges } from '@/lib/review/ask-for-changes';
import { askForReview } from '@/lib/review/ask-for-review';
import { signOff } from '@/lib/review/sign-off';
import { openNote } from '@/lib/review/write-note';
import { DemoActors } from './demo-actors';
import { demoBench, demoPeople } from './demo-people';

/** Ten years: the demo does not end by itself. */
const linkLife = 3_650 * 86_400_000;

export interface DemoAccount { readonly email: string; readonly password: string }

/**
 * Makes the demo bench in an empty database: its people with the passwords given, circuits in every state, drawn, cut, reviewed
 * and signed through the same use cases as people use. `secret` makes the landing page's guest token.
 */
export async function seedDemo(db: Database, accounts: readonly DemoAccount[], secret: string): Promise<void> {
  const ids = await seedPeople(db, accounts);
  const actors = new DemoActors(db, ids);
  const post = (key: string, drawing: Drawing) => actors.post(key, drawing.title, draw(drawing, () => ulid()));

  const welder = await post('lena', spotWelderTrigger);
  const welderA = await actors.cut('lena', welder, 'First board');
  await askForReview(actors.act('lena'), await actors.revision('lena', welderA), { reviewers: [actors.id('ruth')] });
  await askForChanges(actors.act('ruth'), await actors.revision('ruth', welderA), 'L1 has no diode, and nothing holds the gate once W1 is off. Both before power.');

  const relay = await post('kofi', relayDriver);
  const relayA = await actors.cut('kofi', relay, 'As wired on the kiln');
  await askForReview(actors.act('kofi'), await actors.revision('kofi', relayA), { reviewers: [] });

  const fan = await post('tomasz', fanDriver);
  const fanA = await actors.cut('tomasz', fan, 'For the soldering bench');
  await askForReview(actors.act('tomasz'), await actors.revision('tomasz', fanA), { reviewers: [] });
  for (const holdPoint of ['12 V', '24 V']) {
    const access = await actors.revision('ruth', fanA);
    await signOff(actors.act('ruth'), access, { holdPoint, contentHash: await actors.hash(fanA), ...(holdPoint === '24 V' ? { conditions: 'Fan guard fitted.' } : {}) });
  }

  const heater = await post('ines', inductionHeaterDriver);
  await actors.cut('ines', heater, 'Low-voltage proof stage, as built');
  await openNote(actors.act('tomasz'), await actors.circuit('tomasz', heater), {
    anchor: { kind: 'part', id: await actors.partId(heater, 'L1') }, mustAnswer: false,
    body: 'Is 180 µH with the workpiece in? Bare coil will read lower and the peak current climbs.',
  });
  await openNote(actors.act('ruth'), await actors.circuit('ruth', heater), {
    anchor: { kind: 'part', id: await actors.partId(heater, 'TP3') }, mustAnswer: false,
    body: 'Differential probe here. A scope earth on 0 V defeats the isolation.',
  });
  for (const circuit of [welder, relay, fan, heater]) await actors.check(circuit);
  await inTransaction(db, async (tx) => {
    await insertGuestLink(tx, { circuit: heater, tokenHash: tokenHash(demoToken(secret, heater)), madeBy: actors.id('ines'), demo: true, expiresAt: new Date(Date.now() + linkLife) });
  });
}

async function seedPeople(db: Database, accounts: readonly DemoAccount[]): Promise<ReadonlyMap<string, string>> {
  const bench = { id: ulid(), ...demoBench };
  const people = await Promise.all(demoPeople.map(async (person) => {
    const account = accounts.find(({ email }) => email === person.email);
    if (!account) throw new Error(`No password was given for ${person.key}.`);
    return { ...person, id: ulid(), passwordHash: await hashPassword(account.password) };
  }));
  const steward = people.find(({ role }) => role === 'steward');
  if (!steward) throw new Error('The demo has no steward.');
  await inTransaction(db, async (tx) => {
    for (const { id, email, name, passwordHash } of people) await insertPerson(tx, { id, email, name, passwordHash });
    await insertBench(tx, bench, steward.id);
    for (const { id, role } of people.filter((person) => person !== steward)) await insertMember(tx, bench.id, id, role);
    await writeAudit(tx, { bench: bench.id, actor: steward.id, action: 'made the bench', detail: { name: bench.name }, requestId: 'demo' });
  });
  return new Map(people.map(({ key, id }) => [key, id]));
}
