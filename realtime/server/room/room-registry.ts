import type { CloseReason } from '@/realtime/close-codes';
import { loadRoom } from './load-room';
import { Room } from './room';
import type { RoomContext } from './room-context';

export type OpenedRoom =
  | { readonly kind: 'open'; readonly room: Room }
  | { readonly kind: 'quarantined'; readonly reason: string }
  | { readonly kind: 'gone' };

/** The rooms of this process: each loaded once, however many ask, and let go some time after the last one left. */
export class RoomRegistry {
  private readonly rooms = new Map<string, Promise<OpenedRoom>>();
  private readonly unloads = new Map<string, NodeJS.Timeout>();
  private stopped = false;

  constructor(private readonly context: RoomContext) {}

  get size(): number {
    return this.rooms.size;
  }

  /** The room, loading it if need be. @throws the driver's error when the database does not answer; the next call tries again */
  async open(roomId: string): Promise<OpenedRoom> {
    if (this.stopped) return { kind: 'gone' };
    this.keep(roomId);
    const known = await this.rooms.get(roomId);
    if (known?.kind === 'open' && known.room.phase !== 'closed' && known.room.phase !== 'quarantined') return known;
    if (known) this.rooms.delete(roomId);
    let opening = this.rooms.get(roomId);
    if (!opening) {
      opening = this.load(roomId);
      this.rooms.set(roomId, opening);
      opening.catch(() => this.rooms.delete(roomId));
    }
    return opening;
  }

  /** A room that is open now, without loading it. */
  async openNow(roomId: string): Promise<Room | undefined> {
    const opened = await this.rooms.get(roomId)?.catch(() => undefined);
    return opened?.kind === 'open' ? opened.room : undefined;
  }

  async allOpen(): Promise<Room[]> {
    const rooms = await Promise.all([...this.rooms.keys()].map((id) => this.openNow(id)));
    return rooms.filter((room) => room !== undefined);
  }

  /** Lets an empty room go after a while. */
  release(roomId: string): void {
    if (this.stopped) return;
    clearTimeout(this.unloads.get(roomId));
    this.unloads.set(roomId, setTimeout(() => void this.unload(roomId), this.context.timing.unloadIdle));
  }

  async closeAll(reason: CloseReason): Promise<void> {
    this.stopped = true;
    for (const timer of this.unloads.values()) clearTimeout(timer);
    await Promise.all((await this.allOpen()).map((room) => room.drain(reason)));
    this.rooms.clear();
  }

  private keep(roomId: string): void {
    clearTimeout(this.unloads.get(roomId));
    this.unloads.delete(roomId);
  }

  private async load(roomId: string): Promise<OpenedRoom> {
    const loaded = await loadRoom(this.context.db, roomId);
    if (loaded.kind === 'quarantined') {
      this.context.log.error({ circuitId: roomId, reason: loaded.reason, alert: 'operator' }, 'a sheet is quarantined');
    }
    if (loaded.kind !== 'open') {
      this.rooms.delete(roomId);
      return loaded;
    }
    const since = { rows: loaded.seq - loaded.snapshotSeq, bytes: loaded.logBytes };
    return { kind: 'open', room: new Room(roomId, this.context, loaded.doc, loaded.seq, since) };
  }

  private async unload(roomId: string): Promise<void> {
    const room = await this.openNow(roomId);
    if (!room || room.fan.size > 0) return;
    await room.compact();
    if (room.fan.size > 0 || room.busy || !this.unloads.delete(roomId)) return;
    this.rooms.delete(roomId);
    await room.drain('restarting');
  }
}
