import { and, eq, gt, isNull } from 'drizzle-orm';
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

async function readPersonGrant(
  db: Executor, roomId: string, personId: string, sessionId: string | null, now: Date, lock: boolean,
): Promise<RoomGrant | undefined> {
  const query = db.select({
    role: memberships.role, membership: memberships.version, archivedAt: circuits.archivedAt, postedBy: circuits.postedBy,
    makerId: circuitMakers.id, session: sessions.id, name: people.name,
  }).from(circuits)
    .innerJoin(people, eq(people.id, personId))
    .innerJoin(memberships, and(eq(memberships.benchId, circuits.benchId), eq(memberships.personId, personId)))
    .leftJoin(circuitMakers, and(
      eq(circuitMakers.circuitId, circuits.id), eq(circuitMakers.personId, personId), eq(circuitMakers.standing, 1),
    ))
    .leftJoin(sessions, and(
      eq(sessions.id, sessionId ?? ''), eq(sessions.userId, personId), gt(sessions.expiresAt, now), gt(sessions.endsAt, now),
    ))
    .where(eq(circuits.id, roomId));
  const [row] = await (lock ? query.for('share') : query);
  if (!row || (sessionId !== null && row.session === null)) return undefined;
  const maker = row.makerId !== null || row.postedBy === personId;
  const archived = row.archivedAt !== null;
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
