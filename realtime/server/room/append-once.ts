import { registerClients } from '@/db/mutations/room-instance';
import { readRoomGrant } from '@/db/queries/room-grant';
import type { NackReason } from '@/realtime/protocol';
import type { EditOutcome } from './edit-queue';
import { roomRoleOf } from './member';
import type { Room } from './room';
import type { RoomContext } from './room-context';
import { writersOf } from './sheet-candidate';

/** One edit made over HTTP: a whole Yjs update on the sheet as it stood at `baseSeq`. */
export interface SingleEdit {
  readonly actorId: string;
  /** Null for a personal access token. */
  readonly sessionId: string | null;
  readonly update: Uint8Array;
  /** The edit is taken only while this is the head; undefined merges it whatever the head. */
  readonly baseSeq?: number | undefined;
  /** A repeat with the same key gets the first one's answer. */
  readonly key: string;
}

export type SingleEditAnswer =
  | { readonly kind: 'committed'; readonly seq: number }
  | { readonly kind: 'sheet-moved'; readonly seq: number }
  | { readonly kind: 'not-allowed' }
  | { readonly kind: 'refused'; readonly reason: NackReason; readonly words: string }
  | { readonly kind: 'unavailable'; readonly words: string };

/** Takes an edit through the same admission, queue and commit as those of sockets; answers after COMMIT. */
export async function appendOnce({ db }: Pick<RoomContext, 'db'>, room: Room, edit: SingleEdit): Promise<SingleEditAnswer> {
  const instance = await room.instance(`key:${edit.key}`, edit.actorId);
  if (!instance) return { kind: 'not-allowed' };
  const grant = await readRoomGrant(db, room.id, { personId: edit.actorId, sessionId: edit.sessionId });
  if (!grant || roomRoleOf(grant) !== 'maker') return { kind: 'not-allowed' };
  const own = new Set(await registerClients(db, room.id, writersOf(edit.update) ?? [], edit.actorId));

  if (instance.committed > 0) return { kind: 'committed', seq: instance.committedSeq };
  if (room.phase !== 'saving') return { kind: 'unavailable', words: room.reason };
  if (instance.received > 0) return { kind: 'unavailable', words: 'The same edit is being stored.' };
  if (edit.baseSeq !== undefined && (edit.baseSeq !== room.headSeq || room.busy)) return { kind: 'sheet-moved', seq: room.headSeq };
  const mayWrite = (clientId: number) => own.has(clientId);
  const verdict = room.admit(edit.update, mayWrite);
  if (!verdict.ok) return { kind: 'refused', reason: verdict.reason, words: verdict.words };
  const outcome = await new Promise<EditOutcome>((settle) => {
    room.enqueue({
      instance, clientSeq: 1, actor: { personId: edit.actorId, sessionId: edit.sessionId, grantVersion: grant.version },
      bytes: edit.update, electrical: verdict.electrical, connection: '', mayWrite, settle,
    });
  });
  switch (outcome.kind) {
    case 'committed': return { kind: 'committed', seq: outcome.seq };
    case 'refused': return { kind: 'refused', reason: outcome.reason, words: outcome.words };
    case 'grant changed': return { kind: 'not-allowed' };
    case 'unavailable': return { kind: 'unavailable', words: 'The database did not take the edit. Send it again.' };
  }
}
