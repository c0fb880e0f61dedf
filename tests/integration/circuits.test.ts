import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import {
  archiveCircuit, getCircuit, getDeck, getNetlist, listCircuits, patchCircuit, postCircuit, postTicket, putDeck, putHoldPoints, putMakers,
} from '@/lib/http/operations/circuits';
import { openThread } from '@/lib/http/operations/review';
import { replaceChecker } from '@/lib/review/check-copy';
import type { Netlist } from '@/lib/netlist/netlist';
import type { Circuit } from '@/lib/schemas/circuit';
import { ApiWorld, type TestPerson } from '../support/api-world';
import { benchWithCircuit, type BenchWithCircuit } from '../support/bench-with-circuit';
import { checkedWith } from '../support/findings';
import { plan } from '../support/drawn-circuit';

const deck = `Low-side stage
V1 VDD 0 12
*@V1 role=supply
R1 IN GATE 100
*@R1 pmax=0.25
R2 GATE 0 22k
*@R2 pmax=0.25
RL VDD OUT 47
*@RL load=heater pmax=10
.end
`;
let world: ApiWorld;
let here: BenchWithCircuit;

beforeAll(async () => {
  world = await ApiWorld.start();
  replaceChecker(async () => checkedWith([]));
});
afterAll(() => world.stop());
beforeEach(async () => { here = await benchWithCircuit(world); });

const post = (body: object, who: TestPerson = here.maker, headers: Record<string, string> = {}) =>
  world.call<Circuit>(who, postCircuit, { params: { bench: here.bench.slug }, body, headers });
const at = (id: string) => ({ params: { id } });
const netlistOf = async (id: string) => (await world.call<Netlist>(here.member, getNetlist, at(id))).body;

describe('posting a circuit', () => {
  it('makes an empty one, its poster the maker', async () => {
    const posted = await post({ title: '  Heater   ' });
    expect(posted).toMatchObject({ status: 201, body: { title: 'Heater', bench: here.bench.slug, state: 'draft', seq: 0, makers: [{ id: here.maker.id }], holdPoints: [], openStops: null, draft: true } });
    expect((await netlistOf(posted.body.id)).parts).toEqual([]);
  });

  it('places and wires a deck: what comes out is what went in', async () => {
    const posted = await post({ title: 'From a deck', deck });
    expect(posted).toMatchObject({ status: 201, body: { seq: 1 } });
    const netlist = await netlistOf(posted.body.id);
    expect(netlist.parts.map(({ ref, kind }) => `${ref} ${kind}`)).toEqual(['R1 resistor', 'R2 resistor', 'RL resistor', 'V1 dc-source']);
    expect(netlist.parts.find(({ ref }) => ref === 'R1')?.pins).toEqual({ 1: 'IN', 2: 'GATE' });
    expect(netlist.title).toBe('From a deck');
    const text = await world.call<string>(here.member, getDeck, at(posted.body.id));
    expect(text.headers.get('content-type')).toBe('text/plain; charset=utf-8');
    expect(text.headers.get('content-disposition')).toMatch(/^attachment/);
    expect(text.body).toMatch(/^R2 GATE 0 22000$/m);
  });

  it('leaves nothing behind of a deck that cannot be read, and says line and reason', async () => {
    const before = (await world.call<{ items: Circuit[] }>(here.maker, listCircuits, { params: { bench: here.bench.slug } })).body.items.length;
    expect(await post({ title: 'Broken', deck: 'Title\nR1 a b 4k7x9\n.end\n' })).toMatchObject({ status: 422, body: { code: 'deck-unreadable', line: 2, reason: expect.any(String) } });
    expect((await post({ title: 'Large', deck: `T\n${'* comment\n'.repeat(40_000)}` })).status).toBe(413);
    expect((await post({ title: 'Two\nlines' })).status).toBe(422);
    expect((await post({ title: '' })).status).toBe(422);
    expect((await post({ title: 'x'.repeat(121) })).status).toBe(422);
    const after = (await world.call<{ items: Circuit[] }>(here.maker, listCircuits, { params: { bench: here.bench.slug } })).body.items.length;
    expect(after).toBe(before);
  });

  it('answers a repeat under one key with the first one, and refuses the key for another request', async () => {
    const headers = { 'idempotency-key': 'k-1' };
    const first = await post({ title: 'Once' }, here.maker, headers);
    expect(await post({ title: 'Once' }, here.maker, headers)).toMatchObject({ status: 200, body: { id: first.body.id } });
    expect(await post({ title: 'Other' }, here.maker, headers)).toMatchObject({ status: 422, body: { code: 'key-reused' } });
    expect((await post({ title: 'Once' }, here.member, headers)).body.id).not.toBe(first.body.id);
    const refused = await post({ title: '' }, here.maker, { 'idempotency-key': 'k-2' });
    expect(refused.status).toBe(422);
    expect((await post({ title: 'Now right' }, here.maker, { 'idempotency-key': 'k-2' })).status).toBe(201);
  });
});

describe('the netlist', () => {
  it('is the same bytes for the same sheet', async () => {
    const { body: { id } } = await post({ title: 'Same', deck });
    const texts = await Promise.all([1, 2].map(async () => JSON.stringify((await world.call(here.member, getNetlist, at(id))).body)));
    expect(texts[0]).toBe(texts[1]);
  });
});

describe('replacing the deck', () => {
  it('is one edit that keeps ids, plan, title and threads, and is seen by the next call', async () => {
    const { body: { id } } = await post({ title: 'Kept', deck });
    await world.call(here.maker, putHoldPoints, { ...at(id), body: plan });
    const thread = await world.call<{ id: string }>(here.member, openThread, { ...at(id), body: { anchor: { kind: 'spot', x: 0, y: 0 }, body: 'Hm' } });
    expect(thread.status).toBe(201);
    const before = await netlistOf(id);
    const put = await world.call<Circuit>(here.maker, putDeck, { ...at(id), body: { deck: deck.replace('22k', '10k') } });
    expect(put).toMatchObject({ status: 200, body: { title: 'Kept', seq: 3, holdPoints: plan } });
    const after = await netlistOf(id);
    expect(after.parts.map((part) => part.id)).toEqual(before.parts.map((part) => part.id));
    expect(after.parts.find(({ ref }) => ref === 'R2')?.facts.value).toBe(10_000);
  });

  it('changes nothing when the deck cannot be read', async () => {
    const { body: { id, seq } } = await post({ title: 'Kept', deck });
    expect((await world.call(here.maker, putDeck, { ...at(id), body: { deck: 'T\nR1 a\n.end' } })).status).toBe(422);
    expect((await world.call<Circuit>(here.maker, getCircuit, at(id))).body.seq).toBe(seq);
  });
});

describe('the power-up plan', () => {
  const set = (body: unknown) => world.call<{ items: object[]; errors?: { path: string }[] }>(here.maker, putHoldPoints, { ...at(here.circuit), body });

  it('is kept in order, makes scenarios that are not known yet, and takes designators for sources', async () => {
    const wanted = [{ name: 'Bench', scenario: 'bench 15 V', source: 'V1', volts: 15, amps: 0.2 }, { name: 'Mains', volts: 325, amps: 2 }];
    expect((await set(wanted)).body.items).toEqual(wanted);
    expect((await netlistOf(here.circuit)).scenarios).toEqual([{ name: 'bench 15 V', ambient: 25, values: {} }]);
    expect((await set([])).body.items).toEqual([]);
  });

  it.each([
    [[{ name: 'a', volts: 15, amps: 1 }, { name: 'a', volts: 36, amps: 1 }], '1.name'],
    [[{ name: 'a', volts: 36, amps: 1 }, { name: 'b', volts: 15, amps: 1 }], '1.volts'],
    [[{ name: 'a', volts: -1, amps: 1 }], '0.volts'],
    [[{ name: 'a', volts: '15', amps: 1 }], '0.volts'],
    [[{ name: 'a', volts: 15, amps: 1, source: 'V9' }], '0.source'],
    [[{ name: 'a', volts: 15, amps: 1, extra: true }], '0'],
    [{ name: 'a' }, ''],
  ])('refuses %j and changes nothing', async (body, path) => {
    const before = (await world.call<Circuit>(here.maker, getCircuit, at(here.circuit))).body;
    const answer = await set(body);
    expect([answer.status, answer.body.errors?.[0]?.path]).toEqual([422, path]);
    expect((await world.call<Circuit>(here.maker, getCircuit, at(here.circuit))).body).toMatchObject({ seq: before.seq, holdPoints: before.holdPoints });
  });
});

describe('keeping a circuit', () => {
  it('lists last changed first, in pages, and leaves archived ones out until they are restored', async () => {
    for (const title of ['B', 'C', 'D']) await post({ title });
    const page = (query: Record<string, string>) => world.call<{ items: Circuit[]; next: string | null }>(here.member, listCircuits, { params: { bench: here.bench.slug }, query });
    const first = (await page({ limit: '3' })).body;
    expect(first.items.map(({ title }) => title)).toEqual(['D', 'C', 'B']);
    const rest = (await page({ limit: '3', cursor: first.next ?? '' })).body;
    expect([rest.items.map(({ title }) => title), rest.next]).toEqual([['Bench circuit'], null]);
    expect((await page({ cursor: 'nonsense' })).status).toBe(422);

    const id = first.items[0]?.id ?? '';
    expect((await world.call(here.maker, archiveCircuit, at(id))).status).toBe(204);
    expect((await page({})).body.items.map(({ title }) => title)).toEqual(['C', 'B', 'Bench circuit']);
    expect((await page({ archived: 'yes' })).body.items.map(({ title }) => title)).toEqual(['D']);
    expect(await world.call(here.maker, putHoldPoints, { ...at(id), body: plan })).toMatchObject({ status: 409, body: { code: 'archived' } });
    expect((await world.call(here.maker, patchCircuit, { ...at(id), body: { archived: false } })).status).toBe(200);
    expect((await page({ archived: 'yes' })).body.items).toEqual([]);
  });

  it('names co-makers and removes them; the poster stays, and rooms are told', async () => {
    const makers = (ids: string[]) => world.call<Circuit>(here.maker, putMakers, { ...at(here.circuit), body: { makers: ids } });
    expect((await makers([here.member.id])).body.makers.map(({ id }) => id)).toEqual([here.maker.id, here.member.id]);
    expect((await world.call(here.member, putHoldPoints, { ...at(here.circuit), body: plan })).status).toBe(200);
    world.rooms.revoked.length = 0;
    expect((await makers([])).body.makers.map(({ id }) => id)).toEqual([here.maker.id]);
    expect(world.rooms.revoked).toContainEqual({ personId: here.member.id, circuitId: here.circuit });
    expect((await world.call(here.member, putHoldPoints, { ...at(here.circuit), body: plan })).status).toBe(403);
    expect((await makers([here.stranger.id])).status).toBe(422);
  });

  it('gives a ticket for the sheet’s room, a new one each time', async () => {
    const ticket = () => world.call<{ ticket: string; url: string; expiresAt: string }>(here.member, postTicket, { ...at(here.circuit), body: {} });
    const [one, two] = [await ticket(), await ticket()];
    expect(one).toMatchObject({ status: 201, body: { url: expect.stringMatching(new RegExp(`^ws://127\\.0\\.0\\.1:\\d+/sheet/${here.circuit}$`)) } });
    expect(one.body.ticket).not.toBe(two.body.ticket);
    expect(Date.parse(one.body.expiresAt) - Date.now()).toBeLessThanOrEqual(30_000);
  });
});
