import { encodeFrame, type Edit, type NackReason } from '@/realtime/protocol';
import { limits } from '@/realtime/limits';
import type { Member } from '../room/member';
import type { Room } from '../room/room';

/** Tells the author that an edit was refused, and has the page open a fresh copy: later frames may lean on it. */
function refuse(member: Member, clientSeq: number, reason: NackReason, words: string, retry = false): void {
  member.send(encodeFrame({ kind: 'nack', clientSeq, reason, retry, words }));
  member.close('rejected');
}

/**
 * One edit from a socket. Whether the sender may write is asked before anything of it is read. An edit already committed is
 * acknowledged again, one under way is left alone, a hole in the numbers ends the socket.
 */
export function takeEdit(room: Room, member: Member, { clientSeq, bytes }: Edit): void {
  const { instance, actor } = member;
  if (member.role !== 'maker' || !instance || actor.personId === undefined) {
    refuse(member, clientSeq, 'role', 'Only makers of this circuit can change its sheet.');
    return;
  }
  if (clientSeq <= instance.committed) {
    member.send(encodeFrame({ kind: 'ack', clientSeq: instance.committed, seq: instance.committedSeq }));
    return;
  }
  if (clientSeq <= instance.received) return;
  // While nothing can be saved the copy keeps its edits; it is told when to send them again.
  if (room.phase !== 'saving') return;
  if (clientSeq !== instance.received + 1) {
    if (!instance.resync) member.close('badProtocol');
    return;
  }
  if (clientSeq - instance.committed > limits.editsInFlight) {
    member.close('overloaded');
    return;
  }
  const mayWrite = (clientId: number) => member.clientIds.has(clientId);
  const verdict = room.admit(bytes, mayWrite);
  if (!verdict.ok) {
    refuse(member, clientSeq, verdict.reason, verdict.words);
    return;
  }
  room.enqueue({
    instance, clientSeq, bytes, electrical: verdict.electrical, connection: member.connection, mayWrite,
    actor: { personId: actor.personId, sessionId: actor.sessionId, grantVersion: member.grant.version },
    settle(outcome) {
      if (outcome.kind === 'refused' && instance.member) refuse(instance.member, clientSeq, outcome.reason, outcome.words);
    },
  });
}
