import type { Database } from '@/db/client';
import { issueRoomTicket } from '@/db/mutations/room-ticket';
import type { Caller } from '@/lib/access/caller';
import type { CircuitAccess } from '@/lib/access/gates';
import { environment } from '@/lib/env/environment';
import { realtimeAddress } from '@/lib/env/realtime-address';
import { Problem } from '@/lib/errors/problem';
import type { Ticket } from '@/lib/schemas/ticket';

/** A single-use ticket for the sheet's room, for 30 s, bound to the person's session or to the guest's link. */
export async function giveTicket(db: Database, caller: Caller, access: CircuitAccess, host: string | null): Promise<Ticket> {
  const guest = access.standing.role === 'guest';
  const actor = guest && caller.link ? { guestLinkId: caller.link.id }
    : caller.person ? { personId: caller.person.id, sessionId: caller.person.session.id } : undefined;
  const issued = actor && await issueRoomTicket(db, access.circuit, actor);
  if (!issued) throw new Problem('not-found');
  return { ticket: issued.ticket, url: `${realtimeAddress(environment(), host)}/sheet/${access.circuit}`, expiresAt: issued.expiresAt.toISOString() };
}
