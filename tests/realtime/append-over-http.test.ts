import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { readRoomContributors } from '@/db/queries/room-contributors';
import { buildDocument } from '@/realtime/server/room/load-room';
import { readStoredRoom } from '@/db/queries/room-state';
import { SheetCopy } from '@/realtime/testing/sheet-copy';
import type { PersonActor } from './support/people-of-the-sheet';
import { SheetWorld } from './support/sheet-world';

let world: SheetWorld;
beforeAll(async () => { world = await SheetWorld.start(); });
afterAll(() => world.stop());

const call = (circuitId: string, actor: PersonActor, update: Uint8Array, more: object = {}) => ({
  circuitId, actorId: actor.personId, sessionId: actor.sessionId, update: Buffer.from(update).toString('base64'), key: crypto.randomUUID(), ...more,
});

async function storedRefs(circuitId: string): Promise<string[]> {
  const stored = await readStoredRoom(world.db, circuitId);
  const copy = new SheetCopy();
  for (const update of stored?.updates ?? []) copy.receive(update);
  return copy.refs();
}

describe('an edit over HTTP', () => {
  it('is answered after its commit, with the seq it got', async () => {
    const { circuitId, maker } = await world.freshPeople();
    const copy = new SheetCopy();
    expect(await world.internal('/internal/append', call(circuitId, maker, copy.addResistor('R1'), { baseSeq: 0 })))
      .toEqual({ status: 200, body: { kind: 'committed', seq: 1 } });
    expect(await world.internal('/internal/append', call(circuitId, maker, copy.addResistor('R2'), { baseSeq: 1 })))
      .toEqual({ status: 200, body: { kind: 'committed', seq: 2 } });
    expect(await storedRefs(circuitId)).toEqual(['R1', 'R2']);
    expect(await readRoomContributors(world.db, circuitId)).toEqual([maker.personId]);
  });

  it('moves nothing when the sheet has moved on', async () => {
    const { circuitId, maker } = await world.freshPeople();
    await world.internal('/internal/append', call(circuitId, maker, new SheetCopy().addResistor('R1'), { baseSeq: 0 }));
    expect(await world.internal('/internal/append', call(circuitId, maker, new SheetCopy().addResistor('R9'), { baseSeq: 0 })))
      .toEqual({ status: 409, body: { kind: 'sheet-moved', seq: 1 } });
    expect(await storedRefs(circuitId)).toEqual(['R1']);
  });

  it('is taken once for a key, also after a restart', async () => {
    const { circuitId, maker } = await world.freshPeople();
    const edit = call(circuitId, maker, new SheetCopy().addResistor('R1'), { baseSeq: 0 });
    const first = await world.internal('/internal/append', edit);
    expect(await world.internal('/internal/append', edit)).toEqual(first);
    await world.restartRealtime();
    expect(await world.internal('/internal/append', edit)).toEqual(first);
    expect(await storedRefs(circuitId)).toEqual(['R1']);
  });

  it('counts as electrical only when the content hash changes', async () => {
    const { circuitId, maker, coMaker } = await world.freshPeople();
    const copy = new SheetCopy();
    await world.internal('/internal/append', call(circuitId, maker, copy.addResistor('R1')));
    const other = new SheetCopy();
    other.receive((await readStoredRoom(world.db, circuitId))?.updates[0] ?? new Uint8Array());
    expect((await world.internal('/internal/append', call(circuitId, coMaker, other.move('R1', 400)))).status).toBe(200);
    expect(await readRoomContributors(world.db, circuitId)).toEqual([maker.personId]);
  });

  it('is refused to everyone but the makers', async () => {
    const { circuitId, maker, member, mentor, steward, stranger } = await world.freshPeople();
    for (const actor of [member, mentor, steward, stranger, { ...maker, sessionId: 'f'.repeat(64) }]) {
      expect(await world.internal('/internal/append', call(circuitId, actor, new SheetCopy().addResistor('R1'))))
        .toEqual({ status: 403, body: { kind: 'not-allowed' } });
    }
    expect((await world.internal('/internal/append', call(circuitId, { ...maker, sessionId: null as never }, new SheetCopy().addResistor('R1')))).status).toBe(200);
  });

  it('is refused with the reason when it is no edit of a sheet', async () => {
    const { circuitId, maker } = await world.freshPeople();
    const copy = new SheetCopy();
    const first = copy.addResistor('R1');
    const second = copy.addResistor('R2');
    const cases = [
      [Uint8Array.of(1, 2, 3, 4), 'bytes'],
      [second, 'gap'],
    ] as const;
    for (const [update, reason] of cases) {
      expect(await world.internal('/internal/append', call(circuitId, maker, update))).toMatchObject({ status: 422, body: { kind: 'refused', reason } });
    }
    const foreign = new SheetCopy();
    foreign.doc.getMap('elsewhere').set('a', 1);
    const { encodeStateAsUpdate } = await import('yjs');
    expect(await world.internal('/internal/append', call(circuitId, maker, encodeStateAsUpdate(foreign.doc)))).toMatchObject({ status: 422, body: { reason: 'schema' } });
    expect((await world.internal('/internal/append', call(circuitId, maker, first))).status).toBe(200);
    expect(await storedRefs(circuitId)).toEqual(['R1']);
  });

  it('needs the shared secret, and no page or proxy can send it', async () => {
    const { circuitId, maker } = await world.freshPeople();
    const edit = call(circuitId, maker, new SheetCopy().addResistor('R1'));
    const { secret } = await import('./support/sheet-world');
    expect((await world.internal('/internal/append', edit, {})).status).toBe(401);
    expect((await world.internal('/internal/append', edit, { authorization: 'Bearer wrong' })).status).toBe(401);
    expect((await world.internal('/internal/append', edit, { authorization: `Bearer ${secret}`, origin: 'http://127.0.0.1:3000' })).status).toBe(404);
    expect((await world.internal('/internal/append', edit, { authorization: `Bearer ${secret}`, 'x-forwarded-for': '10.0.0.9' })).status).toBe(404);
    expect((await world.internal('/internal/append', { ...edit, key: '' })).status).toBe(400);
    expect(await storedRefs(circuitId)).toEqual([]);
  });

  it('is not there for a circuit that has no room', async () => {
    const { maker } = await world.freshPeople();
    expect(await world.internal('/internal/append', call('0'.repeat(26), maker, new SheetCopy().addResistor('R1'))))
      .toEqual({ status: 404, body: { kind: 'not-found' } });
  });

  it('many at once get dense numbers', async () => {
    const { circuitId, maker } = await world.freshPeople();
    const answers = await Promise.all(Array.from({ length: 40 }, (_, index) =>
      world.internal('/internal/append', call(circuitId, maker, new SheetCopy().addResistor(`R${index + 1}`)))));
    expect(answers.map(({ body }) => (body as { seq: number }).seq).sort((a, b) => a - b)).toEqual(Array.from({ length: 40 }, (_, index) => index + 1));
    const stored = await readStoredRoom(world.db, circuitId);
    expect(buildDocument(stored?.updates ?? []).getMap('parts').size).toBe(40);
  });
});
