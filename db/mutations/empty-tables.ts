import { sql } from 'drizzle-orm';
import type { Database } from '../client';

/** Empties every table but the record of migrations. Only for a seeding that was cut off before anybody could come in. */
export async function emptyTables(db: Database): Promise<void> {
  const [rows] = await db.execute(sql`select table_name as name from information_schema.tables
    where table_schema = database() and table_name <> '__drizzle_migrations'`) as unknown as [{ name: string }[]];
  await db.transaction(async (tx) => {
    await tx.execute(sql`set foreign_key_checks = 0`);
    for (const { name } of rows) await tx.execute(sql`delete from ${sql.identifier(name)}`);
    await tx.execute(sql`set foreign_key_checks = 1`);
  });
}
