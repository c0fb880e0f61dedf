import { and, eq, gt, isNull, sql } from 'drizzle-orm';
import type { Executor } from '../client';
import { circuitMakers, circuits, guestLinks } from '../schema/circuits';
import { memberships, people, sessions } from '../schema/people';

/** Who is at the other end: a person in a session (null: a personal token or the seed), or a guest link's holder. */
export type RoomActor =
  | { readonly personId: string; readonly sessionId: string | null; readonly guestLinkId?: undefined }
  | { readonly guestLinkId: string; readonly personId?: undefined; readonly sessionId?: undefined };

/** What decides an actor's part in a sheet, as the database has it now. */
export interface RoomGrant {
  readonly benchRole: 'member' | 'mentor' | 'steward' | 'guest';
  readonly maker: boolean;
  readonly archived: boolean;
  /** The person's name; empty for a guest. */
  readonly name: string;
  /** Changes whenever anything above that decides access does. */
  readonly version: string;
}

/**
 * The actor's grant on a room; undefined when there is none: session ended, not in the bench, link ended, circuit gone.
 * With `lock` the rows stay as they are until the transaction ends, so nobody is removed between this read and the commit.
 */
export async function readRoomGrant(
  db: Executor, roomId: string, actor: RoomActor, { now = new Date(), lock = false } = {},
): Promise<RoomGrant | undefined> {
  return actor.guestLinkId !== undefined
    ? readGuestGrant(db, roomId, actor.guestLinkId, now)
    : readPersonGrant(db, roomId, actor.personId, actor.sessionId, now, lock);
}

interface PersonGrantRow {
  readonly role: 'member' | 'mentor' | 'steward';
  readonly membership: number;
  readonly archived: number;
  readonly maker: number;
  readonly session: string | null;
  readonly name: string;
}

async function readPersonGrant(
  db: Executor, roomId: string, personId: string, sessionId: string | null, now: Date, lock: boolean,
): Promise<RoomGrant | undefined> {
  // Drizzle writes `for share`, which MariaDB does not know.
  const [rows] = await db.execute(sql`select ${memberships.role} as role, ${memberships.version} as membership,
      ${circuits.archivedAt} is not null as archived, ${people.name} as name, ${sessions.id} as session,
      (${circuitMakers.id} is not null or ${circuits.postedBy} = ${people.id}) as maker
    from ${circuits}
    join ${people} on ${people.id} = ${personId}
    join ${memberships} on ${memberships.benchId} = ${circuits.benchId} and ${memberships.personId} = ${people.id}
    left join ${circuitMakers} on ${circuitMakers.circuitId} = ${circuits.id} and ${circuitMakers.personId} = ${people.id}
      and ${circuitMakers.standing} = 1
    left join ${sessions} on ${sessions.id} = ${sessionId} and ${sessions.userId} = ${people.id}
      and ${sessions.expiresAt} > ${now} and ${sessions.endsAt} > ${now}
    where ${circuits.id} = ${roomId} ${lock ? sql`lock in share mode` : sql``}`) as unknown as [PersonGrantRow[]];
  const row = rows[0];
  if (!row || (sessionId !== null && row.session === null)) return undefined;
  const maker = Number(row.maker) === 1;
  const archived = Number(row.archived) === 1;
  return {
    benchRole: row.role, maker, archived, name: row.name,
    version: `${row.role}.${row.membership}.${maker ? 'maker' : '-'}.${archived ? 'archived' : '-'}`,
  };
}

async function readGuestGrant(db: Executor, roomId: string, linkId: string, now: Date): Promise<RoomGrant | undefined> {
  const [row] = await db.select({ archivedAt: circuits.archivedAt }).from(guestLinks)
    .innerJoin(circuits, eq(circuits.id, guestLinks.circuitId))
    .where(and(eq(guestLinks.id, linkId), eq(guestLinks.circuitId, roomId), isNull(guestLinks.endedAt), gt(guestLinks.expiresAt, now)));
  if (!row) return undefined;
  const archived = row.archivedAt !== null;
  return { benchRole: 'guest', maker: false, archived, name: '', version: `guest.${archived ? 'archived' : '-'}` };
}
