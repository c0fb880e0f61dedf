import { createHash, randomBytes } from 'node:crypto';
import { and, eq, gt, isNull, lt } from 'drizzle-orm';
import type { Database, Executor } from '../client';
import { readRoomGrant, type RoomActor } from '../queries/room-grant';
import { rtTicket } from '../schema/room';

/** A ticket is good for this long, in milliseconds. */
export const ticketLife = 30_000;

const hashOf = (token: string) => createHash('sha256').update(token).digest('hex');

/**
 * Gives the actor a single-use ticket for one room, bound to their session and to their grant as it stands.
 * Undefined when they have no grant.
 */
export async function issueRoomTicket(
  db: Executor, roomId: string, actor: RoomActor, now = new Date(),
): Promise<{ ticket: string; expiresAt: Date } | undefined> {
  const grant = await readRoomGrant(db, roomId, actor, { now });
  if (!grant) return undefined;
  const ticket = randomBytes(16).toString('base64url');
  const expiresAt = new Date(now.getTime() + ticketLife);
  await db.insert(rtTicket).values({
    tokenHash: hashOf(ticket), roomId, personId: actor.personId ?? null, sessionId: actor.sessionId ?? null,
    guestLinkId: actor.guestLinkId ?? null, grantVersion: grant.version, expiresAt,
  });
  return { ticket, expiresAt };
}

export interface TicketHolder {
  readonly roomId: string;
  readonly actor: RoomActor;
  readonly grantVersion: string;
}

/** Uses a ticket up. Undefined when it is unknown, past its time or used before; the database settles two at once. */
export async function redeemRoomTicket(db: Executor, token: string, now = new Date()): Promise<TicketHolder | undefined> {
  const tokenHash = hashOf(token);
  const [used] = await db.update(rtTicket).set({ usedAt: now })
    .where(and(eq(rtTicket.tokenHash, tokenHash), isNull(rtTicket.usedAt), gt(rtTicket.expiresAt, now)));
  if (used.affectedRows !== 1) return undefined;
  const [row] = await db.select().from(rtTicket).where(eq(rtTicket.tokenHash, tokenHash));
  if (!row) return undefined;
  const actor = row.guestLinkId !== null ? { guestLinkId: row.guestLinkId }
    : row.personId !== null ? { personId: row.personId, sessionId: row.sessionId } : undefined;
  return actor && { roomId: row.roomId, actor, grantVersion: row.grantVersion };
}

/** Removes tickets that can no longer be used. */
export async function forgetOldTickets(db: Database, now = new Date()): Promise<void> {
  await db.delete(rtTicket).where(lt(rtTicket.expiresAt, new Date(now.getTime() - ticketLife)));
}
