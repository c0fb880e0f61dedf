import { createServer } from 'node:http';
import { forgetOldTickets } from '@/db/mutations/room-ticket';
import { durabilityProblem } from '@/db/queries/durability';
import { limits } from '@/realtime/limits';
import { internalListener } from './internal/internal-server';
import type { RoomContext } from './room/room-context';
import { RoomRegistry } from './room/room-registry';
import { Connections } from './socket/connections';
import { GrantWatch } from './socket/grant-watch';
import { serveSockets, type SocketServerSettings } from './socket/socket-server';

export interface RealtimeSettings extends SocketServerSettings {
  readonly host: string;
  /** 0: any free port. */
  readonly port: number;
  /** Shared with web for calls between them. */
  readonly secret: string;
  /** Pause between two looks at the grants of open sockets, milliseconds; at most 5,000. */
  readonly grantPoll?: number;
}

export interface RunningRealtime {
  readonly port: number;
  readonly rooms: RoomRegistry;
  readonly connections: Connections;
  /** Stops taking sockets in, commits what was taken in, closes every socket with 1012. */
  close(): Promise<void>;
}

const ticketSweep = 60_000;

/**
 * Starts the realtime process's server: sheet sockets, readiness and internal calls on one port.
 * @throws Error when the database could lose what it acknowledged
 */
export async function serveRealtime(context: RoomContext, settings: RealtimeSettings): Promise<RunningRealtime> {
  const problem = await durabilityProblem(context.db);
  if (problem !== undefined) throw new Error(`Edits would not be safe in this database: ${problem}`);

  const rooms = new RoomRegistry(context);
  const connections = new Connections();
  const watch = new GrantWatch(context.db, connections, Math.min(settings.grantPoll ?? limits.grantPoll, 5_000));
  const server = createServer(internalListener({
    context, rooms, secret: settings.secret,
    recheck: (call) => watch.check(connections.concernedBy(call)),
    healthy: () => durabilityProblem(context.db).then((found) => found === undefined, () => false),
    connections: () => connections.size,
  }));
  const stopSockets = serveSockets(server, context, rooms, connections, settings);
  await new Promise<void>((resolve, reject) => {
    server.once('error', reject);
    server.listen(settings.port, settings.host, resolve);
  });
  watch.start();
  const sweep = setInterval(() => void forgetOldTickets(context.db).catch(() => {}), ticketSweep);
  const address = server.address();

  return {
    port: typeof address === 'object' && address !== null ? address.port : settings.port,
    rooms, connections,
    async close() {
      stopSockets();
      watch.stop();
      clearInterval(sweep);
      await rooms.closeAll('restarting');
      for (const connection of connections.all()) connection.close('restarting');
      const closed = new Promise((resolve) => server.close(resolve));
      server.closeIdleConnections();
      await closed;
    },
  };
}
