import { createServer } from 'node:net';

/**
 * True when nothing listens on the port.
 * @param {number} port
 * @param {string} host
 */
export function portIsFree(port, host = '127.0.0.1') {
  return new Promise((resolve) => {
    const server = createServer();
    server.once('error', () => resolve(false));
    server.listen({ port, host, exclusive: true }, () => server.close(() => resolve(true)));
  });
}

/** A port that is free now, chosen by the system. @returns {Promise<number>} */
export function anyFreePort(host = '127.0.0.1') {
  return new Promise((resolve, reject) => {
    const server = createServer();
    server.once('error', reject);
    server.listen({ port: 0, host, exclusive: true }, () => {
      const address = server.address();
      server.close(() => (address && typeof address === 'object' ? resolve(address.port) : reject(new Error('No free port'))));
    });
  });
}

/**
 * The wanted port if it is free, else any free one.
 * @param {number} wanted
 * @param {string} host
 */
export async function preferredPort(wanted, host = '127.0.0.1') {
  return (await portIsFree(wanted, host)) ? wanted : anyFreePort(host);
}
