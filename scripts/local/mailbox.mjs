import { mkdirSync, renameSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import { randomUUID } from 'node:crypto';
import { SMTPServer } from 'smtp-server';

const largestMessage = 10 * 1024 * 1024;

/**
 * Takes any mail and files it as received, one `.eml` a message, newest last by name.
 * @param {number} port
 * @param {string} folder
 * @returns {Promise<() => Promise<void>>} stops it
 */
export function startMailbox(port, folder) {
  mkdirSync(folder, { recursive: true, mode: 0o700 });
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['AUTH', 'STARTTLS'],
    size: largestMessage,
    onData: (stream, _session, done) => {
      /** @type {Buffer[]} */
      const parts = [];
      stream.on('data', (bytes) => parts.push(bytes));
      stream.on('end', () => {
        const name = path.join(folder, `${new Date().toISOString().replaceAll(':', '')}-${randomUUID()}`);
        writeFileSync(`${name}.partial`, Buffer.concat(parts), { mode: 0o600 });
        renameSync(`${name}.partial`, `${name}.eml`);
        done();
      });
    },
  });
  return new Promise((resolve, reject) => {
    server.once('error', reject);
    server.listen(port, '127.0.0.1', () => resolve(() => new Promise((closed) => server.close(() => closed()))));
  });
}
