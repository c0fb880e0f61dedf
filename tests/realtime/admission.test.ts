import { randomBytes } from 'node:crypto';
import * as Y from 'yjs';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { readRoom, readUpdatesAfter } from '@/db/queries/room-state';
import { encodeFrame, type NackReason } from '@/realtime/protocol';
import type { FrameSocket } from '@/realtime/testing/frame-socket';
import { SheetCopy } from '@/realtime/testing/sheet-copy';
import type { SheetPeople } from './support/people-of-the-sheet';
import { SheetWorld } from './support/sheet-world';

let world: SheetWorld;
beforeAll(async () => { world = await SheetWorld.start(); });
afterAll(() => world.stop());

async function enterWith(people: SheetPeople, copy: SheetCopy, more: { instance?: string } = {}): Promise<FrameSocket> {
  const socket = await world.enter(people.circuitId, people.maker, { clientIds: [copy.clientId], ...more });
  await socket.next('part');
  return socket;
}

const head = async (people: SheetPeople) => (await readRoom(world.db, people.circuitId))?.headSeq;

async function expectRefused(socket: FrameSocket, bytes: Uint8Array, reason: NackReason, clientSeq = 1): Promise<void> {
  socket.send({ kind: 'edit', clientSeq, bytes });
  const nack = await socket.next('nack');
  expect(nack).toMatchObject({ clientSeq, reason, retry: false });
  expect(nack.words.length).toBeGreaterThan(10);
  expect((await socket.closing()).code).toBe(4409);
}

describe('an edit is refused, stored nowhere and shown to nobody', () => {
  it('when its bytes are no update', async () => {
    const people = await world.freshPeople();
    await expectRefused(await enterWith(people, new SheetCopy()), randomBytes(200), 'bytes');
    expect(await head(people)).toBe(0);
  });

  it('when it is cut short', async () => {
    const people = await world.freshPeople();
    const copy = new SheetCopy();
    const whole = copy.addResistor('R1');
    await expectRefused(await enterWith(people, copy), whole.subarray(0, whole.length - 7), 'bytes');
    expect(await head(people)).toBe(0);
  });

  it('when it leans on one that never came', async () => {
    const people = await world.freshPeople();
    const copy = new SheetCopy();
    copy.addResistor('R1');
    await expectRefused(await enterWith(people, copy), copy.addResistor('R2'), 'gap');
    expect(await head(people)).toBe(0);
  });

  it('when it deletes what is not there', async () => {
    const people = await world.freshPeople();
    const copy = new SheetCopy();
    copy.addResistor('R1');
    await expectRefused(await enterWith(people, copy), copy.remove('R1'), 'gap');
    expect(await head(people)).toBe(0);
  });

  it('when it comes under another person\'s client id', async () => {
    const people = await world.freshPeople();
    const [mine, theirs] = [new SheetCopy(), new SheetCopy()];
    const other = await world.enter(people.circuitId, people.coMaker, { clientIds: [theirs.clientId] });
    await other.next('part');
    const socket = await world.enter(people.circuitId, people.maker, { clientIds: [mine.clientId, theirs.clientId] });
    await socket.next('part');
    await expectRefused(socket, theirs.addResistor('R1'), 'foreign id');
    expect(await head(people)).toBe(0);
    expect(other.of('change')).toEqual([]);
  });

  it('when its client id was never registered', async () => {
    const people = await world.freshPeople();
    await expectRefused(await enterWith(people, new SheetCopy()), new SheetCopy().addResistor('R1'), 'foreign id');
  });

  it('when the result would be no sheet', async () => {
    const people = await world.freshPeople();
    const copy = new SheetCopy();
    const socket = await enterWith(people, copy);
    copy.doc.getMap<Y.Map<unknown>>('parts').set('bad', new Y.Map(Object.entries({ kind: 'no such kind' })));
    await expectRefused(socket, Y.encodeStateAsUpdate(copy.doc), 'schema');
  });
});

describe('after a refusal', () => {
  it('the room takes good edits as if nothing had been', async () => {
    const people = await world.freshPeople();
    const good = new SheetCopy();
    const author = await world.enter(people.circuitId, people.coMaker, { clientIds: [good.clientId] });
    author.send({ kind: 'edit', clientSeq: 1, bytes: good.addResistor('R1') });
    await author.next('ack');
    await expectRefused(await enterWith(people, new SheetCopy()), randomBytes(64), 'bytes');
    author.send({ kind: 'edit', clientSeq: 2, bytes: good.addResistor('R2') });
    expect(await author.next('ack', (ack) => ack.clientSeq === 2)).toMatchObject({ seq: 2 });
    const fresh = new SheetCopy(await (await world.enter(people.circuitId, people.member)).whole());
    expect(fresh.refs()).toEqual(['R1', 'R2']);
  });

  it('random mutations of real edits never leave a mark', async () => {
    const people = await world.freshPeople();
    let seed = 7;
    const random = () => (seed = (Math.imul(seed, 1_664_525) + 1_013_904_223) >>> 0) / 2 ** 32;
    for (let round = 0; round < 25; round += 1) {
      const copy = new SheetCopy();
      const bytes = Uint8Array.from(copy.addResistor('R1'));
      for (let change = 0; change < 3; change += 1) bytes[Math.floor(random() * bytes.length)] = Math.floor(random() * 256);
      const socket = await enterWith(people, copy);
      socket.send({ kind: 'edit', clientSeq: 1, bytes });
      await Promise.race([socket.next('nack'), socket.next('ack'), socket.closing()]);
      socket.cut();
    }
    const stored = await readUpdatesAfter(world.db, people.circuitId, 0);
    const rebuilt = new SheetCopy();
    for (const row of stored) rebuilt.receive(row.bytes);
    const { store } = rebuilt.doc;
    expect([store.pendingStructs, store.pendingDs]).toEqual([null, null]);
    const shown = new SheetCopy(await (await world.enter(people.circuitId, people.member)).whole());
    expect(Y.encodeStateVector(shown.doc)).toEqual(Y.encodeStateVector(rebuilt.doc));
  }, 60_000);
});

describe('numbering', () => {
  it('an edit sent twice is stored once and acknowledged twice', async () => {
    const people = await world.freshPeople();
    const copy = new SheetCopy();
    const instance = 'a-copy-that-sends-twice';
    const first = await enterWith(people, copy, { instance });
    const edit = { kind: 'edit', clientSeq: 1, bytes: copy.addResistor('R1') } as const;
    first.send(edit);
    await first.next('ack');
    first.send(edit);
    const second = await enterWith(people, copy, { instance });
    expect(await second.next('welcome')).toMatchObject({ committed: 1 });
    second.send(edit);
    expect(await second.next('ack')).toEqual({ kind: 'ack', clientSeq: 1, seq: 1 });
    expect(await head(people)).toBe(1);
    expect((await first.closing()).code).toBe(1012);
  });

  it('a hole ends the socket', async () => {
    const people = await world.freshPeople();
    const copy = new SheetCopy();
    const socket = await enterWith(people, copy);
    socket.send({ kind: 'edit', clientSeq: 1, bytes: copy.addResistor('R1') });
    await socket.next('ack');
    socket.send({ kind: 'edit', clientSeq: 3, bytes: copy.addResistor('R2') });
    expect((await socket.closing()).code).toBe(4400);
  });

  it('a copy that missed rows gets them when it asks', async () => {
    const people = await world.freshPeople();
    const copy = new SheetCopy();
    const socket = await enterWith(people, copy);
    for (let clientSeq = 1; clientSeq <= 3; clientSeq += 1) socket.send({ kind: 'edit', clientSeq, bytes: copy.addResistor(`R${clientSeq}`) });
    await socket.next('ack', (ack) => ack.clientSeq === 3);
    socket.send({ kind: 'need', fromSeq: 2 });
    await socket.next('change', (change) => change.seq === 3);
    expect(socket.of('change').map((change) => change.seq)).toEqual([2, 3]);
    socket.send({ kind: 'need', fromSeq: 99 });
    expect(await socket.next('part', (part) => part.uptoSeq === 3)).toMatchObject({ index: 0 });
  });
});

it('a frame over 1 MiB is closed as too big', async () => {
  const people = await world.freshPeople();
  const socket = await enterWith(people, new SheetCopy());
  socket.sendBytes(encodeFrame({ kind: 'edit', clientSeq: 1, bytes: new Uint8Array(1024 * 1024 + 1) }));
  expect((await socket.closing()).code).toBe(1009);
});

it('presence cannot speak for others, say what is not allowed, or grow', async () => {
  const people = await world.freshPeople();
  const witness = await world.enter(people.circuitId, people.member);
  for (const text of [
    '{"person":"someone"}', '{"name":"Someone"}', 'not json', JSON.stringify({ cursor: { x: 1e9, y: 0 } }),
    JSON.stringify({ selection: Array.from({ length: 1_000 }, () => 'x') }),
  ]) {
    const socket = await world.enter(people.circuitId, people.guest);
    socket.send({ kind: 'presence', text });
    expect((await socket.closing()).code).toBe(4400);
  }
  for (const { text } of witness.of('presence')) expect(text).not.toContain('omeone');
});
