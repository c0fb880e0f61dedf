import { randomBytes } from 'node:crypto';
import { WebSocket } from 'ws';
import { openDatabase } from '@/db/client';
import { issueRoomTicket } from '@/db/mutations/room-ticket';
import type { RoomActor } from '@/db/queries/room-grant';
import { FrameSocket } from '@/realtime/testing/frame-socket';
import { SheetCopy } from '@/realtime/testing/sheet-copy';
import { anyFreePort } from '../../scripts/machine/free-port.mjs';
import { startTemporaryServer } from '../../scripts/mariadb/temporary-server.mjs';
import { addSheetPeople } from '../realtime/support/people-of-the-sheet';
import { makeDatabase } from '../realtime/support/sheet-world';
import { childServer } from './support/child-server';
import { figure, quantile, report } from './support/figures';
import { until } from './support/until';

/**
 * An edit shown to 20 other clients, commit to disk included, beside a relay that stores nothing: both servers are
 * processes of their own, the same bytes go through both, and rounds alternate.
 */
const others = 20;
const rounds = 150;
const warmUp = 20;
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

async function enter(actor: RoomActor, clientIds: readonly number[]): Promise<FrameSocket> {
  const issued = await issueRoomTicket(connection.db, people.circuitId, actor);
  if (!issued) throw new Error('No ticket.');
  const socket = await new FrameSocket(`ws://127.0.0.1:${port}/sheet/${people.circuitId}`, { origin }).opened();
  socket.hello(issued.ticket, { instance: randomBytes(16).toString('base64url'), clientIds });
  await socket.next('welcome');
  return socket;
}

async function relayClient(): Promise<{ readonly socket: WebSocket; readonly count: () => number }> {
  const socket = new WebSocket(`ws://127.0.0.1:${relay.firstLine}`, { perMessageDeflate: false });
  let count = 0;
  socket.on('message', () => { count += 1; });
  await new Promise((resolve) => socket.once('open', resolve));
  return { socket, count: () => count };
}

const copy = new SheetCopy();
const author = await enter(people.maker, [copy.clientId]);
copy.receive(await author.whole());
const readers = await Promise.all(Array.from({ length: others }, () => enter(people.member, [])));
const relayAuthor = await relayClient();
const relayReaders = await Promise.all(Array.from({ length: others }, relayClient));

const [committed, relayed]: [number[], number[]] = [[], []];
for (let round = 1; round <= warmUp + rounds; round += 1) {
  // A drawn sheet does not grow with every edit: parts are placed once, then moved.
  const bytes = round <= 30 ? copy.addResistor(`R${round}`) : copy.move(`R${(round % 30) + 1}`, 20 * (round % 400));
  const started = performance.now();
  author.send({ kind: 'edit', clientSeq: round, bytes });
  await until('everybody to see the edit', () => readers.every((reader) => reader.of('change').length >= round));
  const seen = performance.now();
  relayAuthor.socket.send(bytes);
  await until('everybody to get the frame', () => relayReaders.every((reader) => reader.count() >= round));
  if (round <= warmUp) continue;
  committed.push(seen - started);
  relayed.push(performance.now() - seen);
}

report([
  figure(`edit committed and shown to ${others} others`, committed, 'ms'),
  figure(`the same bytes through a plain relay`, relayed, 'ms'),
  figure('ratio of medians, room to relay', [quantile(committed, 0.5) / quantile(relayed, 0.5)], '×', { atMost: 3 }),
]);

for (const socket of [author, ...readers]) socket.cut();
for (const { socket } of [relayAuthor, ...relayReaders]) socket.terminate();
await Promise.all([realtime.stop(), relay.stop()]);
await connection.close();
await mariadb.stop();
