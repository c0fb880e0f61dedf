import type { Member } from './member';

/** How far one browser copy's edits have come, for as long as its room is open. */
export class RoomInstance {
  /** Highest edit taken in for committing. */
  received: number;
  /** After an outage the copy sends again from `committed + 1`; what was already under way before that is left unread. */
  resync = false;
  /** The socket it speaks through now. */
  member: Member | undefined;

  constructor(
    readonly id: string,
    readonly personId: string,
    /** Highest edit that is committed. */
    public committed: number,
    /** Room seq of that edit. */
    public committedSeq: number,
  ) {
    this.received = committed;
  }

  commit(clientSeq: number, seq: number): void {
    this.committed = clientSeq;
    this.committedSeq = seq;
    this.received = Math.max(this.received, clientSeq);
  }

  /** Forgets what was taken in but not committed. */
  rewind(): void {
    this.received = this.committed;
    this.resync = true;
  }
}
