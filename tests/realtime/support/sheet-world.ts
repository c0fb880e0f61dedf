import { randomBytes } from 'node:crypto';
import { sql } from 'drizzle-orm';
import { pino } from 'pino';
import { openDatabase, type Connection, type Database } from '@/db/client';
import { migrateDatabase } from '@/db/migrate';
import { issueRoomTicket } from '@/db/mutations/room-ticket';
import type { RoomActor } from '@/db/queries/room-grant';
import { documentHash } from '@/realtime/server/room/content-hash';
import { roomTiming, type RoomTiming } from '@/realtime/server/room/room-context';
import { serveRealtime, type RunningRealtime } from '@/realtime/server/serve-realtime';
import { FrameSocket, type SocketOptions } from '@/realtime/testing/frame-socket';
import { startTemporaryServer } from '../../../scripts/mariadb/temporary-server.mjs';
import { addSheetPeople, type SheetPeople } from './people-of-the-sheet';

export const pageOrigin = 'http://127.0.0.1:3000';
export const secret = 'a secret that only these tests know';

export type DurableServer = Awaited<ReturnType<typeof startTemporaryServer>>;

/** Makes an empty, migrated database on the server and gives its address. */
export async function makeDatabase(server: DurableServer): Promise<string> {
  const name = `holdoff_${randomBytes(6).toString('hex')}`;
  const root = openDatabase(server.url(''));
  await root.db.execute(sql.raw(`create database ${name}`));
  await root.close();
  await migrateDatabase(server.url(name));
  return server.url(name);
}

/** A realtime server in this process on a MariaDB of its own, on disk and flushed at every commit, with people of every role. */
export class SheetWorld {
  private constructor(
    readonly server: DurableServer,
    readonly address: string,
    private readonly connection: Connection,
    public realtime: RunningRealtime,
    readonly people: SheetPeople,
    private readonly timing: Partial<RoomTiming>,
    private readonly publicUrl: string,
  ) {}

  static async start(timing: Partial<RoomTiming> = {}, publicUrl = pageOrigin): Promise<SheetWorld> {
    const server = await startTemporaryServer({ durable: true });
    const address = await makeDatabase(server);
    const connection = openDatabase(address);
    const people = await addSheetPeople(connection.db);
    return new SheetWorld(server, address, connection, await startRealtime(connection.db, timing, publicUrl), people, timing, publicUrl);
  }

  get db(): Database {
    return this.connection.db;
  }

  /** A circuit of its own for one test: the same people, an empty sheet. */
  async freshPeople(): Promise<SheetPeople> {
    return addSheetPeople(this.db);
  }

  async stop(): Promise<void> {
    await this.realtime.close();
    await this.connection.close();
    await this.server.stop();
  }

  async restartRealtime(): Promise<void> {
    await this.realtime.close();
    this.realtime = await startRealtime(this.db, this.timing, this.publicUrl);
  }

  url(circuitId: string): string {
    return `ws://127.0.0.1:${this.realtime.port}/sheet/${circuitId}`;
  }

  async ticket(circuitId: string, actor: RoomActor): Promise<string> {
    const issued = await issueRoomTicket(this.db, circuitId, actor);
    if (!issued) throw new Error('No ticket: the actor has no grant.');
    return issued.ticket;
  }

  socket(circuitId: string, options: SocketOptions = { origin: pageOrigin }): Promise<FrameSocket> {
    return new FrameSocket(this.url(circuitId), options).opened();
  }

  /** A socket that is let in as the actor. */
  async enter(circuitId: string, actor: RoomActor, hello: Parameters<FrameSocket['hello']>[1] = {}): Promise<FrameSocket> {
    const socket = await this.socket(circuitId);
    socket.hello(await this.ticket(circuitId, actor), { instance: randomBytes(12).toString('base64url'), ...hello });
    await socket.next('welcome');
    return socket;
  }

  /** A call from web; the answer's status and body. */
  async internal(path: string, body: unknown, headers: Record<string, string> = { authorization: `Bearer ${secret}` }): Promise<{ status: number; body: unknown }> {
    const response = await fetch(`http://127.0.0.1:${this.realtime.port}${path}`, {
      method: 'POST', headers: { 'content-type': 'application/json', ...headers }, body: JSON.stringify(body),
    });
    const text = await response.text();
    return { status: response.status, body: text === '' ? undefined : JSON.parse(text) };
  }
}

function startRealtime(db: Database, timing: Partial<RoomTiming>, publicUrl: string): Promise<RunningRealtime> {
  return serveRealtime(
    { db, log: pino({ level: process.env['REALTIME_TEST_LOG'] ?? 'silent' }), contentHash: documentHash, timing: { ...roomTiming, ...timing } },
    { host: '127.0.0.1', port: 0, secret, publicUrl, trustProxy: 0 },
  );
}
