import { and, eq } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { idempotency } from '@/db/schema/audit';
import { benchGate } from '@/lib/access/gates';
import { postSheet } from '@/lib/circuits/post-circuit';
import { getNetlist, listCircuits, postCircuit } from '@/lib/http/operations/circuits';
import { listBenches, makeBench } from '@/lib/http/operations/people';
import { listThreads, moveThread, openThread, replyCall } from '@/lib/http/operations/review';
import { replaceChecker } from '@/lib/review/check-copy';
import type { Netlist } from '@/lib/netlist/netlist';
import { ApiWorld, type TestPerson } from '../support/api-world';
import { benchWithCircuit, callerOf, personOf, type BenchWithCircuit } from '../support/bench-with-circuit';
import { checkedWith } from '../support/findings';

let world: ApiWorld;
let here: BenchWithCircuit;
type Items = { readonly items: readonly { readonly id: string; readonly title?: string; readonly messages?: readonly unknown[] }[] };

beforeAll(async () => {
  world = await ApiWorld.start();
  replaceChecker(async () => checkedWith([]));
  here = await benchWithCircuit(world);
});
afterAll(() => world.stop());

const at = (id: string) => ({ params: { id } });
const bench = () => ({ params: { bench: here.bench.slug } });
const keyed = (key: string) => ({ headers: { 'idempotency-key': key } });
const minutesAgo = (minutes: number) => new Date(Date.now() - minutes * 60_000);

/** As a crash between the commit and the stored answer leaves a key. */
async function cutOff(person: TestPerson, key: string): Promise<void> {
  await world.db.update(idempotency).set({ done: false, status: null, answer: null, createdAt: minutesAgo(2) })
    .where(and(eq(idempotency.personId, person.id), eq(idempotency.key, key)));
}

describe('a request that was cut off after its commit, sent again with its key', () => {
  it.each([
    ['circuit', postCircuit, () => ({ ...bench(), body: { title: 'Once only' } }), async () => (await world.call<Items>(here.maker, listCircuits, bench())).body.items.filter(({ title }) => title === 'Once only')],
    ['bench', makeBench, () => ({ body: { name: 'Second bench' } }), async () => (await world.call<Items>(here.maker, listBenches)).body.items.slice(1)],
    ['note', openThread, () => ({ ...at(here.circuit), body: { anchor: { kind: 'spot', x: 1, y: 1 }, body: 'Once?' } }), async () => (await world.call<Items>(here.maker, listThreads, at(here.circuit))).body.items],
  ] as const)('answers the %s that was made, and makes no second one', async (_, call, request, made) => {
    const key = `crash-${call.id}`;
    const first = await world.call<{ id: string }>(here.maker, call, { ...request(), ...keyed(key) });
    expect(first.status).toBe(201);
    await cutOff(here.maker, key);
    expect(await world.call(here.maker, call, { ...request(), ...keyed(key) })).toMatchObject({ status: 200, body: { id: first.body.id } });
    expect(await made()).toHaveLength(1);
  });

  it('adds a reply, and the words that go with an answer, once', async () => {
    const { body: note } = await world.call<{ id: string }>(here.maker, openThread, { ...at(here.circuit), body: { anchor: { kind: 'spot', x: 2, y: 2 }, body: 'Why?' } });
    for (const [call, body] of [[replyCall, { body: 'Because.' }], [moveThread, { status: 'answered', body: 'Done.' }]] as const) {
      const sent = () => world.call(here.maker, call, { ...at(note.id), body, ...keyed(`crash-${call.id}`) });
      const first = await sent();
      await cutOff(here.maker, `crash-${call.id}`);
      expect(await sent()).toMatchObject({ status: 200, body: { id: first.body['id'] } });
    }
    const { items } = (await world.call<Items>(here.maker, listThreads, at(here.circuit))).body;
    expect(items.find(({ id }) => id === note.id)?.messages).toHaveLength(3);
  });
});

it('draws the deck of a circuit that was posted but not drawn when the server went down', async () => {
  const deck = 't\nV1 a 0 12\n*@V1 role=supply\nR1 a 0 1k\n*@R1 pmax=1\n.end\n';
  const request = { ...bench(), body: { title: 'Half posted', deck }, ...keyed('half') };
  const done = await world.call<{ id: string }>(here.maker, postCircuit, { ...request, headers: { 'idempotency-key': 'whole' } });
  const [row] = await world.db.select().from(idempotency).where(eq(idempotency.key, 'whole'));
  expect(row?.thingId).toBe(done.body.id);

  const thing = `${done.body.id.slice(0, 25)}${done.body.id.endsWith('0') ? '1' : '0'}`;
  const act = { db: world.db, person: personOf(here.maker), requestId: 'test', now: new Date(), thing };
  await postSheet(act, await benchGate(world.db, callerOf(here.maker), here.bench.slug), 'Half posted');
  await world.db.insert(idempotency).values({ personId: here.maker.id, key: 'half', requestHash: row?.requestHash ?? '', thingId: thing, createdAt: minutesAgo(2) });
  expect(await world.call(here.maker, postCircuit, request)).toMatchObject({ status: 200, body: { id: thing, seq: 1 } });
  expect((await world.call<Netlist>(here.maker, getNetlist, at(thing))).body.parts.map(({ ref }) => ref)).toEqual(['R1', 'V1']);
});

it('answers two sent at once with one key alike: the second waits for the first', async () => {
  const send = () => world.call<{ id: string }>(here.maker, postCircuit, { ...bench(), body: { title: 'Pressed twice' }, ...keyed('twice') });
  const answers = await Promise.all([send(), send(), send()]);
  expect(answers.map(({ status }) => status).sort()).toEqual([200, 200, 201]);
  expect(new Set(answers.map(({ body }) => body.id)).size).toBe(1);
});
