import path from 'node:path';
import { migrate } from 'drizzle-orm/mysql2/migrator';
import { openDatabase } from './client';

/** Brings the database at `address` up to the committed migrations in `folder`; does nothing when it is up to date. */
export async function migrateDatabase(address: string, folder = path.join(process.cwd(), 'db/migrations')): Promise<void> {
  const connection = openDatabase(address);
  try {
    await migrate(connection.db, { migrationsFolder: folder });
  } finally {
    await connection.close();
  }
}
