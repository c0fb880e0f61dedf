import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { readRoom } from '@/db/queries/room-state';
import type { RoomActor } from '@/db/queries/room-grant';
import { closeCodes } from '@/realtime/close-codes';
import { clientFrameKinds, encodeFrame, frameBytes, type ClientFrame, type FrameKind } from '@/realtime/protocol';
import type { FrameSocket } from '@/realtime/testing/frame-socket';
import { SheetCopy } from '@/realtime/testing/sheet-copy';
import { waitFor } from '@/realtime/testing/wait-for';
import type { SheetPeople } from './support/people-of-the-sheet';
import { SheetWorld } from './support/sheet-world';

let world: SheetWorld;
beforeAll(async () => { world = await SheetWorld.start(); });
afterAll(() => world.stop());

type Who = 'maker' | 'coMaker' | 'member' | 'mentor' | 'steward' | 'guest';
const insiders = ['maker', 'coMaker', 'member', 'mentor', 'steward', 'guest'] as const satisfies readonly Who[];
const writers: readonly Who[] = ['maker', 'coMaker'];

type Outcome = 'answered' | 'taken' | 'shown' | 'silent' | 'refused' | 'closed';

/** What the server does with each kind of frame from each role, once the socket is let in. Every kind there is must stand here. */
const expected: { readonly [K in FrameKind]: (who: Who) => Outcome } = {
  edit: (who) => (writers.includes(who) ? 'taken' : 'refused'),
  need: () => 'answered',
  presence: () => 'shown',
  ping: () => 'answered',
  pong: () => 'silent',
  hello: () => 'closed',
  welcome: () => 'closed', part: () => 'closed', ack: () => 'closed', nack: () => 'closed', change: () => 'closed', state: () => 'closed',
  event: () => 'closed',
};

const copies = new WeakMap<FrameSocket, SheetCopy>();

async function enter(people: SheetPeople, who: Who): Promise<FrameSocket> {
  const copy = new SheetCopy();
  const socket = await world.enter(people.circuitId, people[who] satisfies RoomActor, { clientIds: [copy.clientId] });
  copies.set(socket, copy);
  return socket;
}

function frameOf(kind: FrameKind, socket: FrameSocket): Uint8Array {
  const samples: { readonly [K in (typeof clientFrameKinds)[number]]: () => Extract<ClientFrame, { kind: K }> } = {
    hello: () => ({ kind: 'hello', ticket: '', protocol: 1, schema: 1, instance: 'x'.repeat(20), clientIds: [], stateVector: Uint8Array.of(0), lastAcked: 0, resume: { hash: '', parts: 0 } }),
    edit: () => ({ kind: 'edit', clientSeq: 1, bytes: copies.get(socket)?.addResistor('R1') ?? new Uint8Array() }),
    need: () => ({ kind: 'need', fromSeq: 1 }),
    presence: () => ({ kind: 'presence', text: JSON.stringify({ cursor: { x: 10, y: 20 } }) }),
    ping: () => ({ kind: 'ping', at: 77 }),
    pong: () => ({ kind: 'pong', at: 77 }),
  };
  const client = clientFrameKinds.find((name) => name === kind);
  return client ? encodeFrame(samples[client]()) : Uint8Array.of(frameBytes[kind], 0);
}

async function outcomeOf(kind: FrameKind, socket: FrameSocket, witness: FrameSocket): Promise<Outcome> {
  await socket.next('part');
  const parts = socket.of('part').length;
  socket.sendBytes(frameOf(kind, socket));
  if (kind !== 'ping') socket.send({ kind: 'ping', at: 4_242 });
  const answeredLater = () => socket.of('pong').some((pong) => pong.at === 4_242);
  return waitFor<Outcome>('what the server does', () => {
    if (socket.of('nack').some((nack) => nack.reason === 'role')) return socket.closed?.code === closeCodes.rejected.code && 'refused';
    if (socket.closed) return socket.closed.code === closeCodes.badProtocol.code && 'closed';
    if (socket.of('ack').length > 0) return witness.of('change').length > 0 && 'taken';
    if (witness.of('presence').some((frame) => frame.text.includes('"cursor":{"x":10,"y":20}'))) return 'shown';
    if (socket.of('pong').some((pong) => pong.at === 77) || socket.of('part').length > parts) return 'answered';
    return kind === 'pong' && answeredLater() && 'silent';
  });
}

describe.each(insiders)('from a %s', (who) => {
  it.each(Object.keys(frameBytes) as FrameKind[])('%s', async (kind) => {
    const people = await world.freshPeople();
    const witness = await enter(people, 'coMaker');
    const socket = await enter(people, who);
    expect(await outcomeOf(kind, socket, witness)).toBe(expected[kind](who));
    expect((await readRoom(world.db, people.circuitId))?.headSeq).toBe(kind === 'edit' && writers.includes(who) ? 1 : 0);
    socket.cut();
    witness.cut();
  });

  it('an unknown kind ends the socket', async () => {
    const people = await world.freshPeople();
    const socket = await enter(people, who);
    socket.sendBytes(Uint8Array.of(99, 1, 2, 3));
    expect((await socket.closing()).code).toBe(4400);
  });
});

describe('from anyone else', () => {
  it('a person of another bench gets no ticket', async () => {
    const people = await world.freshPeople();
    await expect(world.ticket(people.circuitId, people.stranger)).rejects.toThrow('no grant');
    await expect(world.ticket(people.circuitId, { ...people.maker, sessionId: 'e'.repeat(64) })).rejects.toThrow('no grant');
    await expect(world.ticket(people.otherCircuitId, people.guest)).rejects.toThrow('no grant');
  });

  it.each(clientFrameKinds.filter((kind) => kind !== 'hello'))('%s before hello ends the socket', async (kind) => {
    const people = await world.freshPeople();
    const socket = await world.socket(people.circuitId);
    copies.set(socket, new SheetCopy());
    socket.sendBytes(frameOf(kind, socket));
    expect((await socket.closing()).code).toBe(4400);
    expect(socket.frames).toEqual([]);
  });
});
