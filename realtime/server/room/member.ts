import type { RoomActor, RoomGrant } from '@/db/queries/room-grant';
import { may } from '@/lib/access/may';
import type { CloseReason } from '@/realtime/close-codes';
import type { RoomRole } from '@/realtime/protocol';
import type { RoomInstance } from './room-instance';

/** One open socket as its room sees it. */
export interface Member {
  /** Also the presence id. */
  readonly connection: string;
  readonly actor: RoomActor;
  readonly grant: RoomGrant;
  readonly role: RoomRole;
  /** Numbers this copy's edits; undefined for those who may not write. */
  readonly instance: RoomInstance | undefined;
  /** Yjs client ids whose structs it may bring. */
  readonly clientIds: ReadonlySet<number>;
  /** Sends an encoded frame. `droppable` frames are left out while the socket is behind. */
  send(frame: Uint8Array, droppable?: boolean): void;
  /** Sends the frames of a first load, however many. */
  sendBulk(frames: readonly Uint8Array[]): void;
  /** Ends the socket; nothing more is read from it. */
  close(reason: CloseReason): void;
}

/** The part an actor plays on a sheet, from the one decision point; nobody edits an archived circuit. */
export function roomRoleOf(grant: RoomGrant): RoomRole {
  if (grant.benchRole === 'guest') return 'guest';
  return !grant.archived && may('edit the sheet', { role: grant.benchRole, maker: grant.maker }) ? 'maker' : 'reader';
}
