import { setTimeout as pause } from 'node:timers/promises';
import type { Database, Transaction } from './client';
import { isDeadlock } from './errors';

const attempts = 5;

/**
 * Runs `work` in one transaction (READ COMMITTED) and repeats it when the server chose it as the victim of a deadlock.
 * `work` must have no effect outside the database; effects follow after this returns.
 */
export async function inTransaction<T>(db: Database, work: (tx: Transaction) => Promise<T>): Promise<T> {
  for (let attempt = 1; ; attempt += 1) {
    try {
      return await db.transaction(work, { isolationLevel: 'read committed' });
    } catch (error) {
      if (!isDeadlock(error) || attempt === attempts) throw error;
      await pause(Math.random() * 20 * attempt);
    }
  }
}
