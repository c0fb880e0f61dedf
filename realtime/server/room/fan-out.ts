import { initialsOf } from '@/lib/review/naming';
import type { PresenceEntry } from '@/realtime/presence-fields';
import { encodeFrame, type RoomSaving } from '@/realtime/protocol';
import type { Member } from './member';
import type { RoomInstance } from './room-instance';
import { PresenceMap } from './presence-map';

/** A row that is committed, on its way to everyone. */
export interface CommittedEdit {
  readonly seq: number;
  readonly clientSeq: number;
  readonly instance: RoomInstance;
  readonly connection: string;
  readonly bytes: Uint8Array;
}

/** Sends a room's frames to its members; each frame is encoded once. */
export class FanOut {
  private readonly members = new Set<Member>();
  readonly presence = new PresenceMap((entries) => {
    const [frame, forGuests] = [presenceFrame(entries), presenceFrame(entries.map(asGuestsSee))];
    for (const member of this.members) member.send(member.role === 'guest' ? forGuests : frame, true);
  });

  get size(): number {
    return this.members.size;
  }

  all(): readonly Member[] {
    return [...this.members];
  }

  add(member: Member): void {
    this.members.add(member);
    const entries = this.presence.all();
    member.send(presenceFrame(member.role === 'guest' ? entries.map(asGuestsSee) : entries));
    this.presence.join(member);
  }

  remove(member: Member): void {
    if (!this.members.delete(member)) return;
    if (member.instance?.member === member) member.instance.member = undefined;
    this.presence.leave(member.connection);
  }

  /** The author is told that the edit is saved; all others are shown it. Both carry the seq, so that nobody misses one. */
  committed(edit: CommittedEdit): void {
    const author = edit.instance.member;
    author?.send(encodeFrame({ kind: 'ack', clientSeq: edit.clientSeq, seq: edit.seq }));
    const change = encodeFrame({ kind: 'change', seq: edit.seq, connection: edit.connection, bytes: edit.bytes });
    for (const member of this.members) if (member !== author) member.send(change);
  }

  saving(saving: RoomSaving, why: string): void {
    for (const member of this.members) {
      member.send(encodeFrame({ kind: 'state', saving, why, committed: member.instance?.committed ?? 0 }));
    }
  }

  event(topic: string, data: unknown): void {
    const frame = encodeFrame({ kind: 'event', topic, text: JSON.stringify(data) });
    for (const member of this.members) member.send(frame);
  }
}

const presenceFrame = (entries: readonly PresenceEntry[]) => encodeFrame({ kind: 'presence', text: JSON.stringify(entries) });

/** Guests see people as initials, each other as they are called. */
function asGuestsSee(entry: PresenceEntry): PresenceEntry {
  return entry.person === null ? entry : { ...entry, name: initialsOf(entry.name) };
}
