import { sql } from 'drizzle-orm';
import type { Database } from '../client';

/**
 * Why a committed transaction might be lost with this server's settings; undefined when it is on disk once COMMIT answers.
 * `innodb_flush_log_at_trx_commit` 0 and 2 can lose the last second, and a replicating server must flush its binary log too
 * (mariadb.com, InnoDB System Variables; Replication and Binary Log System Variables).
 * @throws the driver's error when the database does not answer
 */
export async function durabilityProblem(db: Database): Promise<string | undefined> {
  const [rows] = await db.execute(sql`select @@innodb_flush_log_at_trx_commit as flush, @@log_bin as binlog, @@sync_binlog as sync,
    @@max_allowed_packet as packet`) as unknown as [{ flush: number; binlog: number; sync: number; packet: number }[]];
  const row = rows[0];
  if (!row) return 'The database did not say how it is set.';
  if (Number(row.flush) !== 1 && Number(row.flush) !== 3) return 'innodb_flush_log_at_trx_commit is not 1.';
  if (Number(row.binlog) === 1 && Number(row.sync) !== 1) return 'The binary log is on and sync_binlog is not 1.';
  if (Number(row.packet) < 16 * 1024 * 1024) return 'max_allowed_packet is under 16 MiB.';
  return undefined;
}

/** Asks the database for nothing. @throws the driver's error when it does not answer */
export async function ping(db: Database): Promise<void> {
  await db.execute(sql`select 1`);
}
