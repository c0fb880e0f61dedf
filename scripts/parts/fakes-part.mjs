import { connect } from 'node:net';
import { fileURLToPath } from 'node:url';

const endWithParent = new URL('./end-with-parent.mjs', import.meta.url).href;
const program = fileURLToPath(new URL('../local/fakes.mjs', import.meta.url));

/**
 * The local stand-ins for a mail server and a file store, in one process; each only when its port is given.
 * @param {{ mailPort?: number, mailFolder: string, filesPort?: number, filesFolder: string, logFile: string }} input
 * @returns {import('./part.mjs').PartPlan}
 */
export function fakesPart({ mailPort, mailFolder, filesPort, filesFolder, logFile }) {
  const ports = [mailPort, filesPort].filter((port) => port !== undefined);
  return {
    name: 'Local mail and files',
    command: process.execPath,
    args: ['--import', endWithParent, program],
    env: {
      ...process.env, MAIL_PORT: String(mailPort ?? ''), MAIL_FOLDER: mailFolder, FILES_PORT: String(filesPort ?? ''), FILES_FOLDER: filesFolder,
    },
    logFile,
    graceMs: 3_000,
    ready: async () => (await Promise.all(ports.map(accepts))).every(Boolean),
  };
}

/** @param {number} port @returns {Promise<boolean>} */
function accepts(port) {
  return new Promise((resolve) => {
    const socket = connect({ host: '127.0.0.1', port });
    socket.once('connect', () => { socket.destroy(); resolve(true); });
    socket.once('error', () => resolve(false));
  });
}
