import { randomBytes } from 'node:crypto';
import { createConnection } from 'mysql2/promise';
import { poolOptions } from '@/db/client';
import { migrateDatabase } from '@/db/migrate';

/** Makes an empty, migrated database on the run's server and gives its address. */
export async function freshDatabase(): Promise<string> {
  const server = process.env['TEST_DATABASE_SERVER'];
  if (!server) throw new Error('TEST_DATABASE_SERVER is not set: run through vitest with its global set-up.');
  const name = `holdoff_${randomBytes(6).toString('hex')}`;
  const { database: _, connectionLimit: __, queueLimit: ___, ...options } = poolOptions(server);
  const connection = await createConnection(options);
  await connection.query(`create database ${name}`);
  await connection.end();
  const address = new URL(server);
  address.pathname = `/${name}`;
  await migrateDatabase(address.href);
  return address.href;
}
