import { createHash } from 'node:crypto';
import type { PresenceEntry, PresenceFields } from '@/realtime/presence-fields';
import type { Member } from './member';

const colours = 8;
/** Changes within this time go out as one frame, milliseconds. */
const flushEvery = 50;

/** Who is on a sheet and what they point at: kept by connection, stamped by the server, never stored, never logged. */
export class PresenceMap {
  private readonly entries = new Map<string, PresenceEntry>();
  private readonly changed = new Map<string, PresenceEntry>();
  private guests = 0;
  private timer: NodeJS.Timeout | undefined;

  constructor(private readonly tell: (entries: readonly PresenceEntry[]) => void) {}

  all(): readonly PresenceEntry[] {
    return [...this.entries.values()];
  }

  join(member: Member): void {
    const person = member.actor.personId ?? null;
    this.set({
      connection: member.connection, person, fields: {},
      name: person === null ? `Guest ${(this.guests += 1)}` : member.grant.name,
      colour: createHash('sha256').update(person ?? member.connection).digest().readUInt8(0) % colours,
    });
  }

  update(connection: string, fields: PresenceFields): void {
    const entry = this.entries.get(connection);
    if (entry) this.set({ ...entry, fields });
  }

  leave(connection: string): void {
    const entry = this.entries.get(connection);
    if (!entry) return;
    this.entries.delete(connection);
    this.changed.set(connection, { ...entry, fields: null });
    this.flush();
  }

  close(): void {
    clearTimeout(this.timer);
  }

  private set(entry: PresenceEntry): void {
    this.entries.set(entry.connection, entry);
    this.changed.set(entry.connection, entry);
    this.timer ??= setTimeout(() => this.flush(), flushEvery);
  }

  private flush(): void {
    clearTimeout(this.timer);
    this.timer = undefined;
    const changed = [...this.changed.values()];
    this.changed.clear();
    if (changed.length > 0) this.tell(changed);
  }
}
