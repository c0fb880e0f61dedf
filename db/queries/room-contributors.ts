import { asc, eq } from 'drizzle-orm';
import type { Executor } from '../client';
import { rtContributor } from '../schema/room';

/** Person ids of everyone who ever made an electrical change of the sheet, in the order of their first one. */
export async function readRoomContributors(db: Executor, roomId: string): Promise<string[]> {
  const rows = await db.select({ personId: rtContributor.personId }).from(rtContributor)
    .where(eq(rtContributor.roomId, roomId)).orderBy(asc(rtContributor.firstSeq));
  return rows.map((row) => row.personId);
}
