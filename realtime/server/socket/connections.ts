import type { RevokeCall } from '@/realtime/internal-calls';
import { limits } from '@/realtime/limits';
import type { Connection } from './connection';

/** The open sockets of this process, by address before they are let in and by person after. */
export class Connections {
  private readonly addresses = new Map<Connection, string>();

  get size(): number {
    return this.addresses.size;
  }

  /** False when this address has as many sockets as it may. */
  hasRoomFor(address: string): boolean {
    return this.count((connection) => this.addresses.get(connection) === address) < limits.connectionsPerAddress;
  }

  add(connection: Connection, address: string): void {
    this.addresses.set(connection, address);
  }

  remove(connection: Connection): void {
    this.addresses.delete(connection);
  }

  /** True unless the person behind this socket has more than they may. Guests count by address alone. */
  withinPersonLimit({ member }: Connection): boolean {
    const person = member?.actor.personId;
    return person === undefined || this.count((other) => other.member?.actor.personId === person) <= limits.connectionsPerPerson;
  }

  joined(): Connection[] {
    return [...this.addresses.keys()].filter((connection) => connection.member !== undefined);
  }

  /** Sockets that a change of rights may concern; an empty call concerns everyone. */
  concernedBy({ personId, sessionId, circuitId, linkId }: RevokeCall): Connection[] {
    return this.joined().filter(({ member, roomId }) =>
      (personId === undefined || member?.actor.personId === personId)
      && (sessionId === undefined || member?.actor.sessionId === sessionId)
      && (linkId === undefined || member?.actor.guestLinkId === linkId)
      && (circuitId === undefined || roomId === circuitId));
  }

  all(): Connection[] {
    return [...this.addresses.keys()];
  }

  private count(holds: (connection: Connection) => boolean): number {
    let count = 0;
    for (const connection of this.addresses.keys()) if (holds(connection)) count += 1;
    return count;
  }
}
