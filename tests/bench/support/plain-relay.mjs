/** The yardstick for a room: passes each frame to everybody else, checks nothing and stores nothing. Prints its port. */
import { WebSocketServer } from 'ws';

const server = new WebSocketServer({ host: '127.0.0.1', port: 0, perMessageDeflate: false });
server.on('connection', (socket) => {
  socket.on('message', (bytes) => {
    for (const other of server.clients) if (other !== socket) other.send(bytes);
  });
});
server.on('listening', () => process.stdout.write(`${/** @type {import('node:net').AddressInfo} */ (server.address()).port}\n`));
process.stdin.once('end', () => process.exit(0)).resume();
