import { existsSync, renameSync, rmSync } from 'node:fs';
import path from 'node:path';
import { findProgram } from '../machine/debian-packages.mjs';
import { runCommand } from '../machine/run-command.mjs';
import { Refusal } from '../machine/say.mjs';
import { runAs } from './server-arguments.mjs';

/**
 * Makes an empty data folder for MariaDB unless it is there. Made beside and renamed, so that a cut leaves nothing half.
 * @param {string} dataFolder
 * @returns {Promise<boolean>} true when it was made now
 */
export async function createDataFolder(dataFolder) {
  if (existsSync(path.join(dataFolder, 'mysql'))) return false;
  const program = findProgram('mariadb-install-db');
  if (!program) throw new Refusal('mariadb-install-db is missing although mariadbd is there. Install Debian\'s mariadb-server.');
  const partial = `${dataFolder}.partial`;
  rmSync(partial, { recursive: true, force: true });
  await runCommand(program, [
    '--no-defaults', `--datadir=${partial}`, '--auth-root-authentication-method=normal', '--skip-test-db', ...runAs(),
  ], { quiet: true });
  renameSync(partial, dataFolder);
  return true;
}
