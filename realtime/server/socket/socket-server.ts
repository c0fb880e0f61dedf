import type { IncomingMessage, Server } from 'node:http';
import { STATUS_CODES } from 'node:http';
import type { Duplex } from 'node:stream';
import { WebSocketServer } from 'ws';
import { limits, subprotocol } from '@/realtime/limits';
import type { RoomContext } from '../room/room-context';
import type { RoomRegistry } from '../room/room-registry';
import { clientAddress } from './client-address';
import { Connection } from './connection';
import type { Connections } from './connections';
import { letIn } from './let-in';
import { checkUpgrade } from './upgrade-check';

export interface SocketServerSettings {
  readonly publicUrl: string;
  /** Proxies in front whose `X-Forwarded-For` is believed. */
  readonly trustProxy: number;
}

function turnAway(socket: Duplex, status: number): void {
  socket.end(`HTTP/1.1 ${status} ${STATUS_CODES[status] ?? ''}\r\nConnection: close\r\nContent-Length: 0\r\n\r\n`);
}

/** Takes sheet sockets on `server`; returns a function that takes no more of them. */
export function serveSockets(
  server: Server, context: RoomContext, rooms: RoomRegistry, connections: Connections, settings: SocketServerSettings,
): () => void {
  const sockets = new WebSocketServer({
    noServer: true, maxPayload: limits.frameBytes, perMessageDeflate: false, handleProtocols: () => subprotocol,
  });
  let stopped = false;

  const upgrade = (request: IncomingMessage, stream: Duplex, head: Buffer): void => {
    stream.on('error', () => stream.destroy());
    const check = checkUpgrade(request.url, request.headers, settings.publicUrl);
    if (!check.ok) return turnAway(stream, check.status);
    const address = clientAddress(request.socket.remoteAddress, request.headers['x-forwarded-for']?.toString(), settings.trustProxy);
    if (stopped) return turnAway(stream, 503);
    if (!connections.hasRoomFor(address)) return turnAway(stream, 429);
    sockets.handleUpgrade(request, stream, head, (socket) => {
      const connection: Connection = new Connection(check.roomId, socket, {
        letIn: (hello) => letIn(context, rooms, check.roomId, hello),
        joined: (joined) => connections.withinPersonLimit(joined),
        ended(ended) {
          connections.remove(ended);
          rooms.release(check.roomId);
        },
        restartSpread: () => Math.min(10_000, 40 * connections.size),
        failed: (error) => context.log.error({ circuitId: check.roomId, err: error }, 'a sheet socket failed'),
      });
      connections.add(connection, address);
      stream.on('data', (chunk: Buffer) => connection.countBytes(chunk.length));
      connection.countBytes(head.length);
    });
  };

  server.on('upgrade', upgrade);
  return () => {
    stopped = true;
    sockets.close();
  };
}
