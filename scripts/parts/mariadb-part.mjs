import { writeFileSync } from 'node:fs';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { endLeftoverServer } from '../data/lock.mjs';
import { findProgram } from '../machine/debian-packages.mjs';
import { accountsSql } from '../mariadb/accounts.mjs';
import { greets } from '../mariadb/ready.mjs';
import { serverArguments } from '../mariadb/server-arguments.mjs';

const guardian = fileURLToPath(new URL('./guardian.mjs', import.meta.url));
/** Name of the database and of the application's account. */
export const databaseName = 'holdoff';

/**
 * MariaDB on this data folder, behind a guardian that watches our pipe.
 * @param {{ data: import('../data/data-folder.mjs').DataFolder, port: number, rootPassword: string, accountPassword: string }} input
 * @returns {import('./part.mjs').PartPlan}
 */
export function mariadbPart({ data, port, rootPassword, accountPassword }) {
  const args = serverArguments({
    dataFolder: data.mariadb, socket: data.socket, pidFile: data.pidFile, logFile: data.log('mariadb'), initFile: data.initFile, port,
  });
  return {
    name: 'MariaDB',
    command: process.execPath,
    args: [guardian, findProgram('mariadbd') ?? 'mariadbd', ...args],
    env: process.env,
    logFile: path.join(path.dirname(data.log('mariadb')), 'mariadb-guardian.log'),
    graceMs: 15_000,
    ready: () => greets({ path: data.socket }),
    before: async () => {
      // A guardian that was killed leaves its server behind; two servers must never share a folder.
      await endLeftoverServer(data);
      const sql = accountsSql({ rootPassword, account: databaseName, accountPassword, databases: databaseName, create: databaseName });
      writeFileSync(data.initFile, sql, { mode: 0o600 });
    },
  };
}
