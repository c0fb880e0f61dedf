import { and, eq, sql } from 'drizzle-orm';
import * as Y from 'yjs';
import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { readRoom, readStoredRoom } from '@/db/queries/room-state';
import { rtRoom, rtSnapshot, rtUpdate } from '@/db/schema/room';
import { takeSnapshot } from '@/realtime/server/room/compaction';
import { documentHash } from '@/realtime/server/room/content-hash';
import { buildDocument } from '@/realtime/server/room/load-room';
import { SheetCopy } from '@/realtime/testing/sheet-copy';
import { waitFor } from '@/realtime/testing/wait-for';
import { Page, pageWorld } from './support/page';
import type { SheetPeople } from './support/people-of-the-sheet';
import { SheetWorld } from './support/sheet-world';

let world: SheetWorld;
let people: SheetPeople;
beforeAll(async () => { world = await SheetWorld.start({ snapshotRows: 10, unloadIdle: 20 }); });
afterAll(() => world.stop());
beforeEach(async () => { people = await world.freshPeople(); });

async function draw(count: number, from = 1): Promise<void> {
  const page = new Page(pageWorld(world), people.circuitId, people.maker);
  await page.loaded();
  for (let number = from; number < from + count; number += 1) page.addResistor(`R${number}`);
  await page.saved();
  page.close();
}

const counts = async () => {
  const snapshots = await world.db.selectDistinct({ seq: rtSnapshot.uptoSeq }).from(rtSnapshot).where(eq(rtSnapshot.roomId, people.circuitId));
  const rows = await world.db.select({ seq: rtUpdate.seq }).from(rtUpdate).where(eq(rtUpdate.roomId, people.circuitId));
  return { snapshots: snapshots.map(({ seq }) => seq).sort((a, b) => a - b), rows: rows.map(({ seq }) => seq).sort((a, b) => a - b) };
};

const stored = async () => buildDocument((await readStoredRoom(world.db, people.circuitId))?.updates ?? []);
const unloaded = () => waitFor('the room to be let go', async () => (await world.realtime.rooms.openNow(people.circuitId)) === undefined);

describe('compaction', () => {
  it('keeps two snapshots and the log after the older of them, and loses nothing', async () => {
    await draw(12);
    await waitFor('a snapshot', async () => (await counts()).snapshots.length > 0);
    await draw(25, 13);
    await unloaded();
    const { snapshots, rows } = await counts();
    expect(snapshots).toHaveLength(2);
    expect(rows[0]).toBe((snapshots[0] ?? 0) + 1);
    expect(rows.at(-1)).toBe(37);
    expect((await stored()).getMap('parts').size).toBe(37);
    const reader = new SheetCopy(await (await world.enter(people.circuitId, people.member)).whole());
    expect(reader.refs()).toHaveLength(37);
  });

  it('races writes without losing one', async () => {
    const one = new Page(pageWorld(world), people.circuitId, people.maker);
    const two = new Page(pageWorld(world), people.circuitId, people.coMaker);
    await one.loaded();
    await two.loaded();
    const opened = await world.realtime.rooms.openNow(people.circuitId);
    for (let number = 1; number <= 60; number += 1) {
      one.addResistor(`R${number}`);
      two.addResistor(`C${number}`);
      if (number % 7 === 0) await opened?.compact();
    }
    await one.saved();
    await two.saved();
    await opened?.compact();
    const document = await stored();
    expect(document.getMap('parts').size).toBe(120);
    expect(Y.encodeStateVector(document)).toEqual(Y.encodeStateVector(one.now.doc));
    expect((await readStoredRoom(world.db, people.circuitId))?.seq).toBe(120);
    one.close();
    two.close();
  });

  it('keeps nothing of a snapshot that reads back as another sheet', async () => {
    await draw(3);
    await unloaded();
    const before = await counts();
    const doc = await stored();
    let calls = 0;
    await expect(takeSnapshot(world.db, people.circuitId, doc, 99, () => `hash ${(calls += 1)}`)).rejects.toThrow('another sheet');
    expect(await counts()).toEqual(before);
  });

  it('a resend is still taken once after its row is gone', async () => {
    const copy = new SheetCopy();
    const instance = 'a-copy-from-long-ago';
    const socket = await world.enter(people.circuitId, people.maker, { instance, clientIds: [copy.clientId] });
    const first = copy.addResistor('R1');
    socket.send({ kind: 'edit', clientSeq: 1, bytes: first });
    await socket.next('ack');
    socket.cut();
    for (const from of [2, 14, 26]) {
      await draw(12, from);
      await unloaded();
    }
    expect((await counts()).rows[0] ?? Infinity).toBeGreaterThan(1);
    const again = await world.enter(people.circuitId, people.maker, { instance, clientIds: [copy.clientId] });
    again.send({ kind: 'edit', clientSeq: 1, bytes: first });
    expect(await again.next('ack')).toMatchObject({ clientSeq: 1, seq: 1 });
    expect((await readRoom(world.db, people.circuitId))?.headSeq).toBe(37);
    again.cut();
  });
});

describe('a stored copy that is damaged', () => {
  const flip = sql`concat(left(bytes, 5), char(ascii(substr(bytes, 6, 1)) ^ 4), substr(bytes, 7))`;
  const room = () => people.circuitId;
  const damages: Record<string, () => Promise<unknown>> = {
    'a bit of a log row': () => world.db.update(rtUpdate).set({ bytes: flip as never }).where(and(eq(rtUpdate.roomId, room()), eq(rtUpdate.seq, 13))),
    'who wrote a log row': () => world.db.update(rtUpdate).set({ actorId: people.mentor.personId }).where(and(eq(rtUpdate.roomId, room()), eq(rtUpdate.seq, 13))),
    'whether a log row is electrical': () => world.db.update(rtUpdate).set({ electrical: false }).where(and(eq(rtUpdate.roomId, room()), eq(rtUpdate.seq, 13))),
    'a bit of the snapshot': () => world.db.update(rtSnapshot).set({ bytes: flip as never }).where(eq(rtSnapshot.roomId, room())),
    'a part of the snapshot': () => world.db.update(rtSnapshot).set({ parts: 2 }).where(eq(rtSnapshot.roomId, room())),
    'a missing log row': () => world.db.delete(rtUpdate).where(and(eq(rtUpdate.roomId, room()), eq(rtUpdate.seq, 12))),
    'the last log row': () => world.db.delete(rtUpdate).where(and(eq(rtUpdate.roomId, room()), eq(rtUpdate.seq, 13))),
    'the head': () => world.db.update(rtRoom).set({ headSeq: 12 }).where(eq(rtRoom.roomId, room())),
  };

  it.each(Object.keys(damages))('%s: nobody edits, nothing is overwritten, and no empty sheet is shown', async (damage) => {
    await draw(10);
    await waitFor('a snapshot', async () => (await counts()).snapshots.length > 0);
    await unloaded();
    const reader = await world.enter(people.circuitId, people.coMaker);
    const copy = new SheetCopy(await reader.whole());
    const writer = await world.enter(people.circuitId, people.maker, { clientIds: [copy.clientId] });
    for (let clientSeq = 1; clientSeq <= 3; clientSeq += 1) writer.send({ kind: 'edit', clientSeq, bytes: copy.addResistor(`C${clientSeq}`) });
    await writer.next('ack', (ack) => ack.clientSeq === 3);
    await world.restartRealtime();
    // The writer's room took no snapshot of its own at the end: its rows are after the one at 10.
    expect((await counts()).rows).toContain(13);
    await damages[damage]?.();
    const before = await counts();

    const page = new Page(pageWorld(world), people.circuitId, people.maker);
    const { room: state, loaded, editable } = await page.until('the quarantine', (now) => now.room.state === 'quarantined');
    expect({ loaded, editable }).toEqual({ loaded: false, editable: false });
    expect(state.why).toContain('damaged');
    expect((await readRoom(world.db, people.circuitId))?.quarantinedAt).toBeInstanceOf(Date);
    expect(await world.internal('/internal/append', {
      circuitId: people.circuitId, actorId: people.maker.personId, sessionId: people.maker.sessionId, key: 'k',
      update: Buffer.from(new SheetCopy().addResistor('R99')).toString('base64'),
    })).toMatchObject({ status: 503 });
    expect(await counts()).toEqual(before);
    page.close();
  });
});

it('a large sheet arrives in parts, goes on where it was cut, and is whole', async () => {
  const page = new Page(pageWorld(world), people.circuitId, people.maker);
  await page.loaded();
  const note = 'What the bench agreed on. '.repeat(70);
  for (let batch = 0; batch < 6; batch += 1) {
    page.now.doc.transact(() => {
      for (let count = 0; count < 60; count += 1) {
        const place = 10 * (batch * 60 + count);
        page.now.doc.getMap<Y.Map<unknown>>('parts').set(`n${place}`, new Y.Map(Object.entries({
          ...Object.fromEntries(page.now.doc.getMap<Y.Map<unknown>>('parts').get('model') ?? []),
          ref: `N${place}`, kind: 'note', x: place, y: place, turn: 0, mirror: false, 'fact:note': note,
        })));
      }
    });
    await page.saved();
  }
  expect(page.now.refused).toEqual([]);
  const first = await world.enter(people.circuitId, people.member);
  const whole = await first.whole();
  const parts = first.of('part');
  expect(parts.length).toBeGreaterThan(2);
  expect(buildDocument([whole]).getMap('parts').size).toBe(360);
  expect(documentHash(buildDocument([whole]))).toBe(documentHash(page.now.doc));

  const again = await world.enter(people.circuitId, people.member, { resume: { hash: parts[0]?.hash ?? '', parts: 2 } });
  expect((await again.next('part')).index).toBe(2);
  const changed = await world.enter(people.circuitId, people.member, { resume: { hash: 'of another sheet', parts: 2 } });
  expect((await changed.next('part')).index).toBe(0);
  page.close();
});
