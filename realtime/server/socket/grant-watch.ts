import type { Database } from '@/db/client';
import { readRoomGrant, type RoomActor } from '@/db/queries/room-grant';
import type { Connection } from './connection';
import type { Connections } from './connections';

const actorKey = (roomId: string, actor: RoomActor) => [roomId, actor.personId, actor.sessionId, actor.guestLinkId].join(' ');

/** Sockets whose grant could not be looked at for this long are closed: nobody stays in by an outage. */
const failClosedAfter = 5_000;

/** Looks at the grants of open sockets again and again, and at once when told; closes those that lost theirs. */
export class GrantWatch {
  private timer: NodeJS.Timeout | undefined;
  private stopped = false;

  constructor(
    private readonly db: Database,
    private readonly connections: Connections,
    /** Pause between two rounds, milliseconds. */
    private readonly pause: number,
    private readonly now: () => number = Date.now,
  ) {}

  start(): void {
    this.timer = setTimeout(() => {
      void this.check(this.connections.joined()).finally(() => {
        if (!this.stopped) this.start();
      });
    }, this.pause);
  }

  stop(): void {
    this.stopped = true;
    clearTimeout(this.timer);
  }

  /** Checks these sockets now. */
  async check(connections: readonly Connection[]): Promise<void> {
    const bySubject = new Map<string, Connection[]>();
    for (const connection of connections) {
      if (!connection.member) continue;
      const key = actorKey(connection.roomId, connection.member.actor);
      bySubject.set(key, [...(bySubject.get(key) ?? []), connection]);
    }
    for (const group of bySubject.values()) await this.checkGroup(group);
  }

  private async checkGroup(group: readonly Connection[]): Promise<void> {
    const [first] = group;
    if (!first?.member) return;
    try {
      const grant = await readRoomGrant(this.db, first.roomId, first.member.actor);
      for (const connection of group) {
        if (!grant) connection.close('accessGone');
        else if (grant.version !== connection.member?.grant.version) connection.close('roleChanged');
        else connection.verifiedAt = this.now();
      }
    } catch {
      for (const connection of group) if (this.now() - connection.verifiedAt > failClosedAfter) connection.close('overloaded');
    }
  }
}
