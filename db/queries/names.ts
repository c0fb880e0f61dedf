import { inArray } from 'drizzle-orm';
import type { Executor } from '../client';
import { people } from '../schema/people';

/** Names of people by id, for showing who did something. */
export async function namesOf(db: Executor, ids: Iterable<string>): Promise<ReadonlyMap<string, string>> {
  const wanted = [...new Set(ids)];
  if (wanted.length === 0) return new Map();
  const rows = await db.select({ id: people.id, name: people.name }).from(people).where(inArray(people.id, wanted));
  return new Map(rows.map((row) => [row.id, row.name]));
}
