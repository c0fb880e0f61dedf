import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import {
  archiveCircuit, getCircuit, getFindings, getNetlist, listCircuits, postCircuit, putDeck, putHoldPoints,
} from '@/lib/http/operations/circuits';
import { endSessions, listMembers, readAudit } from '@/lib/http/operations/people';
import { askCall, cutCall, moveThread, openThread, replyCall, signOffCall } from '@/lib/http/operations/review';
import { replaceChecker } from '@/lib/review/check-copy';
import type { Circuit } from '@/lib/schemas/circuit';
import type { Revision } from '@/lib/schemas/revision';
import type { Thread } from '@/lib/schemas/thread';
import { ApiWorld } from '../support/api-world';
import { benchWithCircuit, postAs, type BenchWithCircuit } from '../support/bench-with-circuit';
import { checkedWith } from '../support/findings';

let world: ApiWorld;
let here: BenchWithCircuit;
const at = (id: string) => ({ params: { id } });

beforeAll(async () => {
  world = await ApiWorld.start();
  replaceChecker(async () => checkedWith([]));
  here = await benchWithCircuit(world);
});
afterAll(() => world.stop());

describe('names of things that cannot be', () => {
  it.each(['😀', 'x', '', "' or 1=1", '\u0000', 'a'.repeat(3_000), '01arz3ndektsv4rrffq69g5fav'])('answers 404 for the circuit %j', async (id) => {
    expect(await world.call(here.maker, getCircuit, at(id))).toMatchObject({ status: 404, body: { code: 'not-found' } });
  });

  it('answers 404 for such a bench, and for a scenario of any length', async () => {
    expect((await world.call(here.maker, listMembers, { params: { bench: '😀' } })).status).toBe(404);
    expect((await world.call(here.maker, getFindings, { ...at(here.circuit), query: { scenario: 'a'.repeat(500) } })).status).toBe(404);
  });

  it('answers 422 for cursors and session ids of nobody’s making', async () => {
    const cursor = (place: unknown) => ({ cursor: Buffer.from(JSON.stringify(place)).toString('base64url') });
    const bench = { params: { bench: here.bench.slug } };
    for (const place of [[1e300, here.circuit], [-1, here.circuit], [0, '😀'.repeat(13)], ['x'], null]) {
      expect((await world.call(here.maker, listCircuits, { ...bench, query: cursor(place) })).status).toBe(422);
    }
    expect((await world.call(here.steward, readAudit, { ...bench, query: cursor(['😀'.repeat(13)]) })).status).toBe(422);
    expect((await world.call(here.maker, endSessions, { body: { id: '😀' } })).status).toBe(422);
  });
});

describe('text that no reader should meet', () => {
  it.each(['a\u0000b', 'a\u001b[31m', 'a\nb', 'a\u202Eb', 'a\u2066b', '\u200b', '\u0301', '\ud800'])('refuses the title %j', async (title) => {
    expect(await world.call(here.maker, postCircuit, { params: { bench: here.bench.slug }, body: { title } })).toMatchObject({ status: 422, body: { code: 'input-wrong' } });
  });

  it.each(['Łódź 2', '日本', 'نص', '👩‍🔧 bench', '<b>&"\'</b>'])('keeps the title %j as written', async (title) => {
    expect((await world.call<Circuit>(here.maker, postCircuit, { params: { bench: here.bench.slug }, body: { title } })).body.title).toBe(title);
  });

  it('refuses half a character wherever it stands, and changes nothing', async () => {
    const before = await world.call<string>(here.maker, getNetlist, at(here.circuit));
    for (const [call, body] of [
      [putHoldPoints, [{ name: '\udc00', volts: 1, amps: 1 }]], [putDeck, { deck: 't\n* \ud800\n.end' }],
      [openThread, { anchor: { kind: 'part', id: '\ud800' }, body: 'x' }], [openThread, { anchor: { kind: 'spot', x: 0, y: 0 }, body: 'a\ud800b' }],
    ] as const) expect(await world.call(here.maker, call, { ...at(here.circuit), body })).toMatchObject({ status: 422, body: { code: 'input-wrong' } });
    expect((await world.call<string>(here.maker, getNetlist, at(here.circuit))).body).toEqual(before.body);
  });

  it('refuses control characters in the note of a cut and the conditions of a sign-off', async () => {
    expect((await world.call(here.maker, cutCall, { ...at(here.circuit), body: { note: 'a\u0007' } })).status).toBe(422);
    const { body: cut } = await world.call<Revision>(here.maker, cutCall, { ...at(here.circuit), body: { note: 'two\nlines' } });
    await world.call(here.maker, askCall, at(cut.id));
    const sign = { holdPoint: cut.holdPoints[0]?.name, contentHash: cut.contentHash };
    expect((await world.call(here.mentor, signOffCall, { ...at(cut.id), body: { ...sign, conditions: 'a\u0000' } })).status).toBe(422);
  });
});

it('takes no note, reply or answer on an archived circuit', async () => {
  const circuit = await postAs(world, here.bench, here.maker);
  const anchor = { kind: 'spot', x: 0, y: 0 };
  const { body: note } = await world.call<Thread>(here.member, openThread, { ...at(circuit), body: { anchor, body: 'Why?' } });
  await world.call(here.maker, archiveCircuit, at(circuit));
  for (const [call, id, body] of [
    [openThread, circuit, { anchor, body: 'x' }], [replyCall, note.id, { body: 'x' }], [moveThread, note.id, { status: 'resolved' }],
  ] as const) expect(await world.call(here.member, call, { ...at(id), body })).toMatchObject({ status: 409, body: { code: 'archived' } });
});
