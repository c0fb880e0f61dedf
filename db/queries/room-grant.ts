import { and, eq, gt, isNull, sql, type SQL } from 'drizzle-orm';
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

/** The actor's grant on a room; undefined when there is none: session ended, not in the bench, link ended, circuit gone. */
export async function readRoomGrant(
  db: Executor, roomId: string, actor: RoomActor, { now = new Date() } = {},
): Promise<RoomGrant | undefined> {
  return actor.guestLinkId !== undefined
    ? readGuestGrant(db, roomId, actor.guestLinkId, now)
    : readPersonGrant(db, roomId, actor.personId, actor.sessionId, now);
}

interface PersonGrantRow {
  readonly role: 'member' | 'mentor' | 'steward';
  readonly archived: number;
  readonly maker: number;
  readonly name: string;
  readonly version: string;
}

const isArchived = sql`${circuits.archivedAt} is not null`;
const isMaker = (personId: string) => sql`(${circuitMakers.id} is not null or ${circuits.postedBy} = ${personId})`;
const version = (personId: string) =>
  sql`concat(${memberships.role}, '.', ${memberships.version}, if(${isMaker(personId)}, '.maker', '.-'), if(${isArchived}, '.archived', '.-'))`;

/** The rows that give a person a part in a circuit: at most one; none when they have no grant. */
function personGrantRows(roomId: string, personId: string, sessionId: string | null, now: Date): SQL {
  const session = sessionId === null ? sql`` : sql`join ${sessions} on ${sessions.id} = ${sessionId} and ${sessions.userId} = ${personId}
      and ${sessions.expiresAt} > ${now} and ${sessions.endsAt} > ${now}`;
  return sql`from ${circuits}
    join ${memberships} on ${memberships.benchId} = ${circuits.benchId} and ${memberships.personId} = ${personId}
    ${session}
    left join ${circuitMakers} on ${circuitMakers.circuitId} = ${circuits.id} and ${circuitMakers.personId} = ${personId}
      and ${circuitMakers.standing} = 1
    where ${circuits.id} = ${roomId}`;
}

/**
 * An SQL number: 1 while the person's grant is `expected`, else 0. The rows it rests on stay as they are until the
 * transaction ends, so that nobody is removed between this look and the commit.
 */
export function grantStands(
  roomId: string, { personId, sessionId }: Extract<RoomActor, { personId: string }>, expected: string, now = new Date(),
): SQL {
  return sql`(select count(*) ${personGrantRows(roomId, personId, sessionId, now)} and ${version(personId)} = ${expected} lock in share mode)`;
}

async function readPersonGrant(
  db: Executor, roomId: string, personId: string, sessionId: string | null, now: Date,
): Promise<RoomGrant | undefined> {
  const [rows] = await db.execute(sql`select ${memberships.role} as role, ${isArchived} as archived, ${isMaker(personId)} as maker,
    (select ${people.name} from ${people} where ${people.id} = ${personId}) as name, ${version(personId)} as version
    ${personGrantRows(roomId, personId, sessionId, now)}`) as unknown as [PersonGrantRow[]];
  const row = rows[0];
  return row && {
    benchRole: row.role, maker: Number(row.maker) === 1, archived: Number(row.archived) === 1, name: row.name, version: row.version,
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
