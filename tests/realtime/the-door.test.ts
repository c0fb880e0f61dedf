import { connect } from 'node:net';
import { randomBytes } from 'node:crypto';
import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { issueRoomTicket } from '@/db/mutations/room-ticket';
import { sessions } from '@/db/schema/people';
import { limits } from '@/realtime/limits';
import type { FrameSocket } from '@/realtime/testing/frame-socket';
import { waitFor } from '@/realtime/testing/wait-for';
import { addSession } from './support/people-of-the-sheet';
import { pageOrigin, SheetWorld } from './support/sheet-world';

let world: SheetWorld;
beforeAll(async () => { world = await SheetWorld.start(); });
afterAll(() => world.stop());

describe('the upgrade', () => {
  it.each([
    ['no origin', undefined, 403],
    ['another site', 'https://elsewhere.test', 403],
    ['this host on another port', 'http://127.0.0.1:9999', 403],
    ['this host by another scheme', 'https://127.0.0.1:3000', 403],
    ['a name that might be rebound', 'http://rebound.test:3000', 403],
    ['no address at all', 'null', 403],
  ])('is refused from %s', async (_, origin, status) => {
    const socket = await world.socket(world.people.circuitId, { origin });
    expect(socket.refused).toBe(status);
  });

  it('is not opened by a header that names another host', async () => {
    const socket = await world.socket(world.people.circuitId, {
      origin: 'http://rebound.test:3000', headers: { host: 'rebound.test:3001', 'x-forwarded-host': '127.0.0.1:3000' },
    });
    expect(socket.refused).toBe(403);
  });

  it('needs the subprotocol and a room in the path', async () => {
    expect((await world.socket(world.people.circuitId, { origin: pageOrigin, protocols: ['other.v1'] })).refused).toBe(400);
    expect((await world.socket('../internal/append', { origin: pageOrigin })).refused).toBe(404);
  });

  it('is capped by the address of the socket, whatever X-Forwarded-For says', async () => {
    const many = await Promise.all(Array.from({ length: limits.connectionsPerAddress + 4 }, (_, index) =>
      world.socket(world.people.circuitId, { origin: pageOrigin, headers: { 'x-forwarded-for': `10.0.0.${index}` } })));
    expect(many.filter((socket) => socket.refused === 429).length).toBeGreaterThanOrEqual(4);
    for (const socket of many) socket.cut();
    await waitFor('the sockets to go', () => world.realtime.connections.size === 0);
  });
});

describe('before hello', () => {
  it('a silent socket is closed after its deadline', async () => {
    const socket = await world.socket(world.people.circuitId);
    expect((await socket.closing(limits.helloDeadline + 2_000)).code).toBe(4400);
  });

  it('a flood is closed, also one that never finishes a frame', async () => {
    const flood = await world.socket(world.people.circuitId);
    flood.sendBytes(new Uint8Array(limits.preAuthBytes + 1));
    expect((await flood.closing()).code).toBe(4400);

    const raw = connect(world.realtime.port, '127.0.0.1');
    raw.write([
      `GET /sheet/${world.people.circuitId} HTTP/1.1`, 'Host: 127.0.0.1:3001', `Origin: ${pageOrigin}`, 'Upgrade: websocket', 'Connection: Upgrade',
      `Sec-WebSocket-Key: ${randomBytes(16).toString('base64')}`, 'Sec-WebSocket-Version: 13', 'Sec-WebSocket-Protocol: holdoff.v1', '', '',
    ].join('\r\n'));
    let over = false;
    let answered = false;
    raw.on('close', () => { over = true; });
    raw.on('error', () => {});
    raw.on('data', () => { answered = true; });
    await waitFor('the upgrade', () => answered);
    // A frame that says it is 1 MiB long, and 20 KiB of it.
    raw.write(Buffer.concat([Buffer.from([0x82, 0xff, 0, 0, 0, 0, 0, 0x10, 0, 0, 1, 2, 3, 4]), Buffer.alloc(20_480)]));
    await waitFor('the socket to go', () => over || world.realtime.connections.size === 0);
    raw.destroy();
  });

  it('text, garbage and foreign versions are closed', async () => {
    const text = await world.socket(world.people.circuitId);
    text.sendBytes('hello');
    expect((await text.closing()).code).toBe(4400);
    const garbage = await world.socket(world.people.circuitId);
    garbage.sendBytes(randomBytes(64));
    expect((await garbage.closing()).code).toBe(4400);
    const old = await world.socket(world.people.circuitId);
    old.hello(await world.ticket(world.people.circuitId, world.people.maker), { protocol: 0 });
    expect((await old.closing()).code).toBe(4426);
    const newer = await world.socket(world.people.circuitId);
    newer.hello(await world.ticket(world.people.circuitId, world.people.maker), { schema: 99 });
    expect((await newer.closing()).code).toBe(4426);
  });
});

describe('a ticket', () => {
  it('lets one socket in, once', async () => {
    const { circuitId, maker } = world.people;
    const ticket = await world.ticket(circuitId, maker);
    const [one, two] = await Promise.all([world.socket(circuitId), world.socket(circuitId)]);
    one.hello(ticket);
    two.hello(ticket, { instance: 'another-instance-here' });
    await waitFor('one of them to be let in', () => one.of('welcome').length + two.of('welcome').length === 1 && (one.closed ?? two.closed));
    expect((one.closed ?? two.closed)?.code).toBe(4403);
  });

  it('is worth nothing after its time, in another room, or when guessed', async () => {
    const { circuitId, otherCircuitId, maker } = world.people;
    const late = await issueRoomTicket(world.db, circuitId, maker, new Date(Date.now() - limits.ticketLife - 1));
    for (const [room, ticket, code] of [
      [circuitId, late?.ticket ?? '', 4403],
      [otherCircuitId, await world.ticket(circuitId, maker), 4401],
      [circuitId, randomBytes(16).toString('base64url'), 4403],
    ] as const) {
      const socket = await world.socket(room);
      socket.hello(ticket);
      expect((await socket.closing()).code).toBe(code);
      expect(socket.frames).toEqual([]);
    }
  });

  it('dies with its session', async () => {
    const { circuitId, maker } = world.people;
    const sessionId = await addSession(world.db, maker.personId);
    const ticket = await world.ticket(circuitId, { personId: maker.personId, sessionId });
    await world.db.delete(sessions).where(eq(sessions.id, sessionId));
    const socket = await world.socket(circuitId);
    socket.hello(ticket);
    expect((await socket.closing()).code).toBe(4401);
  });

  it('cannot speak for another person\'s browser copy', async () => {
    const people = await world.freshPeople();
    const instance = 'instance-of-the-maker';
    const first = await world.enter(people.circuitId, people.maker, { instance, clientIds: [7] });
    const other = await world.socket(people.circuitId);
    other.hello(await world.ticket(people.circuitId, people.coMaker), { instance });
    expect((await other.closing()).code).toBe(4400);
    expect(first.closed).toBeUndefined();
  });
});

it('a person has only so many sockets', async () => {
  const people = await world.freshPeople();
  const sockets: FrameSocket[] = [];
  for (let count = 0; count < limits.connectionsPerPerson; count += 1) sockets.push(await world.enter(people.circuitId, people.member));
  const one = await world.socket(people.circuitId);
  one.hello(await world.ticket(people.circuitId, people.member));
  expect((await one.closing()).code).toBe(1013);
  for (const socket of sockets) socket.cut();
});
