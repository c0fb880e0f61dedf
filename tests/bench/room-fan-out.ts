import { randomBytes } from 'node:crypto';
import { setTimeout as pause } from 'node:timers/promises';
import type { WebSocket } from 'ws';
import { openDatabase } from '@/db/client';
import { issueRoomTicket } from '@/db/mutations/room-ticket';
import type { RoomActor } from '@/db/queries/room-grant';
import { protocolVersion, schemaVersion, subprotocol } from '@/realtime/limits';
import { encodeFrame, frameBytes } from '@/realtime/protocol';
import { SheetCopy } from '@/realtime/testing/sheet-copy';
import { anyFreePort } from '../../scripts/machine/free-port.mjs';
import { startTemporaryServer } from '../../scripts/mariadb/temporary-server.mjs';
import { addSheetPeople } from '../realtime/support/people-of-the-sheet';
import { makeDatabase } from '../realtime/support/sheet-world';
import { childServer } from './support/child-server';
import { CountingClients, openSocket } from './support/counting-clients';
import { figure, quantile, report } from './support/figures';

/**
 * An edit shown to 20 other clients, commit to disk included, beside a relay that stores nothing: both servers are
 * processes of their own, the same bytes go through both, and rounds alternate.
 */
const others = 20;
const rounds = 150;
const warmUp = 20;
/** 15 edits a second, as people drag: above 20 a second a room gathers changes for 16 ms. */
const paceMs = 66;
const origin = 'http://127.0.0.1:3000';

const mariadb = await startTemporaryServer({ durable: true });
const address = await makeDatabase(mariadb);
const connection = openDatabase(address);
const people = await addSheetPeople(connection.db);
const port = await anyFreePort();
const realtime = await childServer(['--import', 'tsx', 'realtime/server/main.ts'], {
  NODE_ENV: 'production', DATABASE_URL: address, REALTIME_PORT: String(port), HOST: '127.0.0.1', PUBLIC_URL: origin, INTERNAL_SECRET: randomBytes(24).toString('hex'),
});
const relay = await childServer(['tests/bench/support/plain-relay.mjs']);

async function enter(actor: RoomActor, clientIds: readonly number[]): Promise<WebSocket> {
  const issued = await issueRoomTicket(connection.db, people.circuitId, actor);
  if (!issued) throw new Error('No ticket.');
  const socket = await openSocket(`ws://127.0.0.1:${port}/sheet/${people.circuitId}`, [subprotocol], origin);
  const welcome = new Promise((resolve) => socket.once('message', resolve));
  socket.send(encodeFrame({
    kind: 'hello', ticket: issued.ticket, protocol: protocolVersion, schema: schemaVersion, instance: randomBytes(16).toString('base64url'), clientIds,
    stateVector: Uint8Array.of(0), lastAcked: 0, resume: { hash: '', parts: 0 },
  }));
  await welcome;
  return socket;
}

const copy = new SheetCopy();
const author = await enter(people.maker, [copy.clientId]);
const readers = new CountingClients(
  await Promise.all(Array.from({ length: others }, () => enter(people.member, []))), (firstByte) => firstByte === frameBytes.change,
);
const relayAddress = `ws://127.0.0.1:${relay.firstLine}`;
const relayAuthor = await openSocket(relayAddress);
const relayReaders = new CountingClients(await Promise.all(Array.from({ length: others }, () => openSocket(relayAddress))));

async function timed(send: () => void, arrived: () => Promise<unknown>): Promise<number> {
  const started = performance.now();
  send();
  await arrived();
  return performance.now() - started;
}

const [committed, relayed]: [number[], number[]] = [[], []];
for (let round = 1; round <= warmUp + rounds; round += 1) {
  // A drawn sheet does not grow with every edit: parts are placed once, then moved.
  const bytes = round <= 30 ? copy.addResistor(`R${round}`) : copy.move(`R${(round % 30) + 1}`, 20 * (round % 400));
  // Whichever goes first finds the machine asleep, so they take turns.
  const turns = [
    () => timed(() => author.send(encodeFrame({ kind: 'edit', clientSeq: round, bytes })), () => readers.all(round)),
    () => timed(() => relayAuthor.send(bytes), () => relayReaders.all(round)),
  ] as const;
  const first = round % 2;
  const one = await turns[first]!();
  const two = await turns[1 - first]!();
  const [seen, passed] = first === 0 ? [one, two] : [two, one];
  await pause(paceMs);
  if (round <= warmUp) continue;
  committed.push(seen);
  relayed.push(passed);
}

report([
  figure(`edit committed and shown to ${others} others`, committed, 'ms'),
  figure(`the same bytes through a plain relay`, relayed, 'ms'),
  figure('ratio of medians, room to relay', [quantile(committed, 0.5) / quantile(relayed, 0.5)], '×', { atMost: 3 }),
]);

for (const socket of [author, relayAuthor]) socket.terminate();
readers.close();
relayReaders.close();
await Promise.all([realtime.stop(), relay.stop()]);
await connection.close();
await mariadb.stop();
