import { registerClients } from '@/db/mutations/room-instance';
import { redeemRoomTicket } from '@/db/mutations/room-ticket';
import { readRoomGrant, type RoomActor, type RoomGrant } from '@/db/queries/room-grant';
import type { CloseReason } from '@/realtime/close-codes';
import { limits, protocolVersion, schemaVersion } from '@/realtime/limits';
import type { Hello, RoomRole } from '@/realtime/protocol';
import { roomRoleOf } from '../room/member';
import type { Room } from '../room/room';
import type { RoomContext } from '../room/room-context';
import type { RoomInstance } from '../room/room-instance';
import type { RoomRegistry } from '../room/room-registry';

export interface LetIn {
  readonly actor: RoomActor;
  readonly grant: RoomGrant;
  readonly role: RoomRole;
  /** Undefined while the room is quarantined. */
  readonly room: Room | undefined;
  readonly quarantine: string;
  readonly instance: RoomInstance | undefined;
  readonly clientIds: ReadonlySet<number>;
}

const instanceForm = /^[A-Za-z0-9_-]{16,64}$/;

/**
 * Decides a hello: versions, the ticket, the grant as it stands now, the room, and whose edits the copy may bring.
 * @returns why the socket is closed, or what it may do
 * @throws the driver's error when the database does not answer; the caller must not let anyone in then
 */
export async function letIn(
  { db }: RoomContext, rooms: RoomRegistry, roomId: string, hello: Hello,
): Promise<LetIn | CloseReason> {
  if (hello.protocol !== protocolVersion || hello.schema !== schemaVersion) return 'clientTooOld';
  if (!instanceForm.test(hello.instance) || hello.clientIds.length > limits.clientIdsPerHello) return 'badProtocol';
  const ticket = await redeemRoomTicket(db, hello.ticket);
  if (!ticket) return 'roleChanged';
  if (ticket.roomId !== roomId) return 'accessGone';
  const { actor } = ticket;
  const grant = await readRoomGrant(db, roomId, actor);
  if (!grant) return 'accessGone';
  if (grant.version !== ticket.grantVersion) return 'roleChanged';
  const role = roomRoleOf(grant);
  const opened = await rooms.open(roomId);
  if (opened.kind === 'gone') return 'deleted';
  if (opened.kind === 'quarantined') {
    return { actor, grant, role, room: undefined, quarantine: opened.reason, instance: undefined, clientIds: new Set() };
  }
  if (role !== 'maker' || actor.personId === undefined) {
    return { actor, grant, role, room: opened.room, quarantine: '', instance: undefined, clientIds: new Set() };
  }
  const instance = await opened.room.instance(hello.instance, actor.personId);
  if (!instance) return 'badProtocol';
  const own = await registerClients(db, roomId, hello.clientIds, actor.personId);
  return { actor, grant, role, room: opened.room, quarantine: '', instance, clientIds: new Set(own) };
}
