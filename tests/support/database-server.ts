import { startTemporaryServer } from '../../scripts/mariadb/temporary-server.mjs';

/**
 * Global set-up of the parts that need a real MariaDB: one server for the run, a database for each test file
 * (`freshDatabase` in `tests/support/database.ts`). Under `npm test` the server is there already.
 */
export default async function setup(): Promise<(() => Promise<void>) | undefined> {
  if (process.env['TEST_DATABASE_SERVER']) return undefined;
  const server = await startTemporaryServer();
  process.env['TEST_DATABASE_SERVER'] = server.url('');
  return server.stop;
}
