import { connect } from 'node:net';

/**
 * True when a MariaDB greets on the port or socket (protocol version 10 in the first packet).
 * @param {{ port: number, host?: string } | { path: string }} place
 */
export function greets(place) {
  return new Promise((resolve) => {
    const socket = connect({ host: '127.0.0.1', ...place });
    const done = (/** @type {boolean} */ answer) => {
      socket.destroy();
      resolve(answer);
    };
    socket.setTimeout(2_000, () => done(false));
    socket.once('error', () => done(false));
    socket.once('end', () => done(false));
    socket.once('data', (bytes) => done(bytes[4] === 10));
  });
}
