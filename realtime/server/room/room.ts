import * as Y from 'yjs';
import { appendRows } from '@/db/mutations/room-append';
import { openInstance } from '@/db/mutations/room-instance';
import { readUpdatesAfter } from '@/db/queries/room-state';
import { documentHardBytes } from '@/lib/document/admission/sheet-limits';
import type { CloseReason } from '@/realtime/close-codes';
import { limits, maxEditBytes } from '@/realtime/limits';
import { encodeFrame, type Hello, type RoomSaving } from '@/realtime/protocol';
import { EditQueue, rowOf, type QueuedEdit } from './edit-queue';
import { FanOut } from './fan-out';
import { takeSnapshot } from './compaction';
import type { Member } from './member';
import { recoverRows, type Recovered } from './recovery';
import type { RoomContext } from './room-context';
import { RoomInstance } from './room-instance';
import { SheetCandidate, type Verdict } from './sheet-candidate';
import { StateParts } from './state-parts';

export type RoomPhase = RoomSaving | 'closed';

/**
 * One open sheet: the only writer of its log. Every edit is admitted on a candidate copy, committed to the database, then
 * acknowledged, then shown to others, in that order and in one queue.
 */
export class Room {
  readonly fan = new FanOut();
  private readonly queue = new EditQueue();
  private readonly instances = new Map<string, RoomInstance>();
  private readonly parts: StateParts;
  private candidate: SheetCandidate;
  private working: Promise<void> | undefined;
  private snapshotting: Promise<void> | undefined;
  private idleTimer: NodeJS.Timeout | undefined;
  private current: RoomPhase = 'saving';
  private why = '';
  private rowsSince: number;
  private bytesSince: number;
  /** At most this large when encoded; worked out anew when it nears the limit. */
  private documentBytes: number;

  constructor(
    readonly id: string,
    private readonly context: RoomContext,
    private readonly committed: Y.Doc,
    private head: number,
    since: { readonly rows: number; readonly bytes: number },
  ) {
    this.candidate = new SheetCandidate(committed, context.contentHash);
    this.parts = new StateParts(committed);
    this.rowsSince = since.rows;
    this.bytesSince = since.bytes;
    this.documentBytes = Y.encodeStateAsUpdate(committed).length;
    this.waitForQuiet();
  }

  get phase(): RoomPhase {
    return this.current;
  }

  get reason(): string {
    return this.why;
  }

  get headSeq(): number {
    return this.head;
  }

  /** True while an edit waits for its commit: the head is about to move. */
  get busy(): boolean {
    return this.queue.length > 0;
  }

  /** A browser copy's progress, from memory or the database; undefined when the copy belongs to another person. */
  async instance(id: string, personId: string): Promise<RoomInstance | undefined> {
    const progress = this.instances.has(id) ? undefined : await openInstance(this.context.db, this.id, id, personId);
    const known = this.instances.get(id);
    if (known) return known.personId === personId ? known : undefined;
    if (!progress) return undefined;
    const instance = new RoomInstance(id, personId, progress.committed, progress.seq);
    this.instances.set(id, instance);
    return instance;
  }

  /** Lets a member in: welcome, the sheet in parts, presence. From here on it gets every committed edit. */
  join(member: Member, hello: Pick<Hello, 'stateVector' | 'resume'>): void {
    if (this.current === 'closed') return member.close('restarting');
    const parts = this.parts.frames(this.head, hello.stateVector, hello.resume);
    const instance = member.instance;
    if (instance) {
      instance.member?.close('restarting');
      instance.member = member;
      instance.resync = true;
    }
    member.send(encodeFrame({
      kind: 'welcome', role: member.role, grantVersion: member.grant.version, headSeq: this.head,
      committed: instance?.committed ?? 0, connection: member.connection,
      saving: this.current, why: this.why, maxEditBytes,
    }));
    member.sendBulk(parts);
    this.fan.add(member);
  }

  leave(member: Member): void {
    this.fan.remove(member);
  }

  /** Brings a member that noticed a hole up to the head: by rows while they are kept, else by the whole. */
  async catchUp(member: Member, fromSeq: number): Promise<void> {
    const rows = await readUpdatesAfter(this.context.db, this.id, fromSeq - 1, limits.needRows).catch(() => []);
    if (rows.length > 0 && rows.length < limits.needRows && rows.at(-1)?.seq === this.head) {
      for (const row of rows) member.send(encodeFrame({ kind: 'change', seq: row.seq, connection: '', bytes: row.bytes }));
    } else {
      member.sendBulk(this.parts.frames(this.head, Uint8Array.of(0)));
    }
  }

  /** Tries an edit on the candidate. A refusal leaves no trace of it there. */
  admit(bytes: Uint8Array, mayWrite: (clientId: number) => boolean): Verdict {
    if (this.documentBytes + bytes.length > documentHardBytes) {
      this.documentBytes = Y.encodeStateAsUpdate(this.committed).length;
      if (this.documentBytes + bytes.length > documentHardBytes) {
        return { ok: false, reason: 'size', words: 'This sheet is as large as a sheet can be. Delete something first.' };
      }
    }
    const verdict = this.candidate.admit(bytes, mayWrite);
    if (!verdict.ok) this.rebuild();
    return verdict;
  }

  /** Queues an admitted edit for the next commit. */
  enqueue(edit: QueuedEdit): void {
    edit.instance.received = edit.clientSeq;
    edit.instance.resync = false;
    this.queue.push(edit);
    this.work();
  }

  /** Closes every socket and takes nothing more in; resolves when what was taken in is committed or given up. */
  async drain(reason: CloseReason): Promise<void> {
    if (this.current === 'saving') this.turn('draining', 'The server is restarting.');
    else this.current = 'closed';
    await this.working;
    await this.snapshotting;
    this.current = 'closed';
    clearTimeout(this.idleTimer);
    for (const member of this.fan.all()) member.close(reason);
    this.fan.presence.close();
    this.candidate.destroy();
    this.committed.destroy();
  }

  /** Takes a snapshot when there is anything to put in it. */
  async compact(): Promise<void> {
    if (this.snapshotting || this.rowsSince === 0 || this.current !== 'saving') return this.snapshotting;
    const rows = this.rowsSince;
    const bytes = this.bytesSince;
    const seq = this.head;
    this.snapshotting = takeSnapshot(this.context.db, this.id, this.committed, seq, this.context.contentHash).then(
      () => {
        this.rowsSince -= rows;
        this.bytesSince -= bytes;
      },
      (error: unknown) => this.context.log.error({ circuitId: this.id, seq, err: error }, 'no snapshot was taken'),
    ).finally(() => {
      this.snapshotting = undefined;
    });
    return this.snapshotting;
  }

  private work(): void {
    if (this.working || this.queue.length === 0 || this.current !== 'saving') return;
    this.working = this.commitAll().finally(() => {
      this.working = undefined;
      this.work();
    });
  }

  private async commitAll(): Promise<void> {
    while (this.queue.length > 0 && (this.current === 'saving' || this.current === 'draining')) {
      const batch = this.queue.nextBatch();
      try {
        const outcome = await this.toldWhenSlow(appendRows(this.context.db, this.id, this.head, batch.map(rowOf)));
        if (outcome.kind === 'committed') this.commit(batch);
        else if (outcome.kind === 'refused') this.dropActors(outcome.actors);
        else await this.recover('The sheet is being opened anew.');
      } catch (error) {
        this.context.log.error({ circuitId: this.id, err: error }, 'an edit could not be stored');
        await this.recover('The database does not take edits.');
      }
    }
  }

  /** A commit that hangs is shown for what it is; edits go on being taken in behind it. */
  private async toldWhenSlow<T>(commit: Promise<T>): Promise<T> {
    let slow = false;
    const timer = setTimeout(() => {
      slow = true;
      this.fan.saving('not saving', 'The database has not answered yet.');
    }, this.context.timing.slowCommit);
    try {
      return await commit;
    } finally {
      clearTimeout(timer);
      if (slow && this.current !== 'closed') this.fan.saving(this.current, this.why);
    }
  }

  private commit(batch: readonly QueuedEdit[]): void {
    this.queue.shift(batch.length);
    for (const edit of batch) {
      this.advance(edit.bytes, edit.instance, edit.clientSeq, edit.connection);
      edit.settle({ kind: 'committed', seq: this.head });
    }
    this.waitForQuiet();
    if (this.rowsSince >= this.context.timing.snapshotRows || this.bytesSince >= this.context.timing.snapshotBytes) void this.compact();
  }

  private advance(bytes: Uint8Array, instance: RoomInstance, clientSeq: number, connection: string): void {
    this.head += 1;
    Y.applyUpdate(this.committed, bytes);
    instance.commit(clientSeq, this.head);
    this.rowsSince += 1;
    this.bytesSince += bytes.length;
    this.documentBytes += bytes.length;
    this.fan.committed({ seq: this.head, clientSeq, instance, connection, bytes });
  }

  private dropActors(actors: Parameters<EditQueue['takeActors']>[0]): void {
    const dropped = this.queue.takeActors(actors);
    for (const edit of dropped) {
      edit.instance.rewind();
      edit.instance.member?.close('roleChanged');
      edit.settle({ kind: 'grant changed' });
    }
    this.rebuild();
  }

  /** A fresh candidate: committed state and, on it, what waits for its commit. */
  private rebuild(): void {
    for (;;) {
      this.candidate.destroy();
      this.candidate = new SheetCandidate(this.committed, this.context.contentHash);
      const misfit = this.queue.readmit(this.candidate);
      if (!misfit) return;
      misfit.edit.instance.rewind();
      misfit.edit.settle({ kind: 'refused', reason: misfit.verdict.reason, words: misfit.verdict.words });
      for (const later of misfit.followers) later.settle({ kind: 'unavailable' });
    }
  }

  /**
   * The database failed, or somebody else moved the head. Nothing is taken in until it answers and takes rows again; then
   * rows that made it into the log unseen are shown, and everyone sends again what is not committed.
   */
  private async recover(why: string): Promise<void> {
    const draining = this.current === 'draining';
    this.turn('not saving', why);
    for (const edit of this.queue.drain()) edit.settle({ kind: 'unavailable' });
    for (const instance of this.instances.values()) instance.rewind();
    if (draining) return;
    const recovered = await recoverRows(this.context, this.id, () => this.head, () => this.current === 'not saving');
    if (recovered) await this.resume(recovered);
  }

  private async resume(recovered: Recovered): Promise<void> {
    if (recovered.kind === 'gone') return this.end('deleted');
    if (recovered.kind === 'quarantined') return this.quarantine(recovered.reason);
    for (const row of recovered.rows) {
      const instance = await this.instance(row.instanceId, row.actorId) ?? new RoomInstance(row.instanceId, row.actorId, 0, 0);
      this.advance(row.bytes, instance, row.clientSeq, '');
    }
    this.rebuild();
    for (const instance of this.instances.values()) instance.rewind();
    this.turn('saving', '');
  }

  private quarantine(reason: string): void {
    this.context.log.error({ circuitId: this.id, reason, alert: 'operator' }, 'a sheet is quarantined');
    this.turn('quarantined', 'The stored copy of this sheet is damaged. An operator has been told; revisions can still be read.');
  }

  private end(reason: CloseReason): void {
    this.current = 'closed';
    clearTimeout(this.idleTimer);
    for (const member of this.fan.all()) member.close(reason);
  }

  private turn(phase: RoomSaving, why: string): void {
    this.current = phase;
    this.why = why;
    this.fan.saving(phase, why);
  }

  private waitForQuiet(): void {
    clearTimeout(this.idleTimer);
    this.idleTimer = setTimeout(() => void this.compact(), this.context.timing.snapshotIdle);
  }
}
