import * as Y from 'yjs';
import type { Doc } from 'yjs';
import { presenceEntrySchema, type PresenceEntry, type PresenceFields } from '../presence-fields';
import type { RoomRole, ServerFrame } from '../protocol';
import type { EditScope, EditStore, RefusedEdit } from './edit-store';
import type { OpenCopies } from './open-copies';
import { Outbox } from './outbox';
import { fits, refusedText } from './refused-text';
import { RoomCopy } from './room-copy';
import { saveMark, type SaveMark } from './save-mark';
import type { TicketAnswer } from './sheet-socket';

export interface SheetSnapshot {
  /** The sheet. Another document takes its place after an edit was refused: bind to it anew, with a fresh undo history. */
  readonly doc: Doc;
  /** False until the sheet is here; an unloaded document is not an empty sheet. */
  readonly loaded: boolean;
  /** Parts of the first load. */
  readonly progress: { readonly done: number; readonly of: number };
  readonly role: RoomRole | null;
  /** True while this person's edits can be taken: a maker, loaded, and no fresh copy on its way. */
  readonly editable: boolean;
  readonly save: SaveMark;
  /** `ended` will not be tried again by itself. */
  readonly line: { readonly state: 'open' } | { readonly state: 'connecting' | 'ended'; readonly why: string };
  /** False when the room is read-only for everyone (a damaged stored copy); `why` is for people. */
  readonly room: { readonly state: 'saving' | 'not saving' | 'draining' | 'quarantined'; readonly why: string };
  /** Everyone else on the sheet. */
  readonly others: readonly PresenceEntry[];
  /** This page's own entry. */
  readonly self: PresenceEntry | null;
  readonly refused: readonly RefusedEdit[];
  /** Seq up to which this copy holds every committed edit: what a cut asks for once nothing waits. */
  readonly seq: number;
  /** True when the browser keeps nothing: edits not yet saved are lost with the page. */
  readonly keptInMemoryOnly: boolean;
}

export type SheetEvent = { readonly topic: string; readonly data: Readonly<Record<string, unknown>> };

export interface SheetSession {
  subscribe(listener: () => void): () => void;
  /** The same object until something changes: fit for `useSyncExternalStore`. */
  getSnapshot(): SheetSnapshot;
  /**
   * Calls `listener` when something beside the sheet changed (`threads`, `revisions`, `findings`, `circuit` …): read it
   * again. Topic `*` comes after a lost connection: anything may have changed.
   */
  onEvent(listener: (event: SheetEvent) => void): () => void;
  /** Shows the others where this person points; sent at most ten times a second, the last one wins. */
  setPresence(fields: PresenceFields): void;
  /** Makes a refused edit again on the sheet as it is now. False when it cannot be: it leans on another refused one. */
  tryAgain(id: string): Promise<boolean>;
  /** The records that a refused edit would have made, as JSON for the clipboard. */
  textOf(id: string): string;
  letGo(id: string): Promise<void>;
  /** Dials again at once, also after the line has ended. */
  reconnect(): void;
  /** Ends the session. Edits not yet saved stay in the browser and go out with the next one. */
  close(): void;
}

export interface SheetSessionOptions {
  readonly circuitId: string;
  /** Null for a guest. */
  readonly personId: string | null;
  /** `POST /api/circuits/{id}/room-ticket`; resolves to `refused` on 401, 403 and 404, rejects on anything else. */
  readonly fetchTicket: () => Promise<TicketAnswer>;
  readonly edits: EditStore;
  readonly copies: OpenCopies;
  readonly WebSocket?: typeof WebSocket;
  readonly keptInMemoryOnly?: boolean;
  /** Longest pause between two tries to connect, milliseconds. */
  readonly longestPause?: number;
}

const presencePause = 100;
const offlineWords = 'This browser is offline.';

/** `openSheetSession` in `open-sheet-session.ts` makes one with the browser's own storage; tests bring theirs. */
export class RoomSession implements SheetSession {
  private copy: RoomCopy | undefined;
  private next: RoomCopy | undefined;
  private readonly scope: EditScope;
  private readonly listeners = new Set<() => void>();
  private readonly eventListeners = new Set<(event: SheetEvent) => void>();
  private readonly releases: (() => void)[] = [];
  private refused: readonly RefusedEdit[] = [];
  private people = new Map<string, PresenceEntry>();
  private presence: PresenceFields = {};
  private presenceTimer: ReturnType<typeof setTimeout> | undefined;
  private readonly patienceTimer = setInterval(() => this.changed(), 1_000);
  private welcomed = false;
  private over = false;
  private memoryOnly: boolean;
  private snapshot: SheetSnapshot;

  constructor(private readonly options: SheetSessionOptions) {
    this.memoryOnly = options.keptInMemoryOnly ?? false;
    this.scope = { personId: options.personId ?? 'guest', circuitId: options.circuitId };
    this.snapshot = this.view(new Y.Doc());
    void this.begin();
  }

  subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  getSnapshot = (): SheetSnapshot => this.snapshot;

  onEvent(listener: (event: SheetEvent) => void): () => void {
    this.eventListeners.add(listener);
    return () => this.eventListeners.delete(listener);
  }

  setPresence(fields: PresenceFields): void {
    this.presence = fields;
    this.presenceTimer ??= setTimeout(() => {
      this.presenceTimer = undefined;
      this.sendPresence();
    }, presencePause);
  }

  async tryAgain(id: string): Promise<boolean> {
    const edit = this.refused.find((other) => other.id === id);
    const { doc, editable } = this.snapshot;
    if (!edit || !editable || !fits(doc, edit)) return false;
    for (const update of edit.updates) Y.applyUpdate(doc, update, 'try again');
    await this.letGo(id);
    return true;
  }

  textOf(id: string): string {
    const edit = this.refused.find((other) => other.id === id);
    return edit ? refusedText(this.snapshot.doc, edit) : '';
  }

  async letGo(id: string): Promise<void> {
    this.refused = this.refused.filter((other) => other.id !== id);
    this.changed();
    await this.options.edits.dropRefused(this.scope, id);
  }

  reconnect(): void {
    (this.next ?? this.copy)?.reconnect();
  }

  close(): void {
    this.over = true;
    clearTimeout(this.presenceTimer);
    clearInterval(this.patienceTimer);
    this.copy?.destroy();
    this.next?.destroy();
    for (const release of this.releases) release();
  }

  private async begin(): Promise<void> {
    this.refused = await this.options.edits.refused(this.scope).catch(() => []);
    this.copy = await this.makeCopy();
    this.changed();
  }

  /** A copy that numbers its edits anew and takes over what copies before it left waiting. */
  private async makeCopy(): Promise<RoomCopy | undefined> {
    const { edits, copies } = this.options;
    const instance = Array.from(crypto.getRandomValues(new Uint8Array(16)), (byte) => byte.toString(16).padStart(2, '0')).join('');
    this.releases.push(copies.hold(instance));
    const open = await copies.list().catch(() => new Set<string>());
    const storeFailed = (): void => {
      this.memoryOnly = true;
      this.changed();
    };
    const outbox = new Outbox(edits, this.scope, instance, () => this.changed(), storeFailed);
    outbox.takeOver(await edits.adopt(this.scope, instance, (other) => open.has(other)).catch(() => []));
    if (this.over) return undefined;
    const copy: RoomCopy = new RoomCopy({
      fetchTicket: this.options.fetchTicket,
      WebSocket: this.options.WebSocket ?? globalThis.WebSocket,
      longestPause: this.options.longestPause ?? 2_500,
      changed: () => this.copyChanged(copy),
      aside: (frame) => this.aside(frame),
      refused: (edit) => {
        this.refused = [...this.refused, edit];
        this.changed();
      },
      spoiled: () => void this.replace(copy),
    }, outbox);
    return copy;
  }

  /** Opens a fresh copy beside a spoiled one, and shows it once it is loaded. */
  private async replace(spoiled: RoomCopy): Promise<void> {
    if (this.over || spoiled !== (this.next ?? this.copy)) return;
    spoiled.hangUp();
    for (const release of this.releases.splice(0)) release();
    const fresh = await this.makeCopy();
    if (!fresh) return;
    if (this.next === spoiled) spoiled.destroy();
    this.next = fresh;
    this.changed();
  }

  private copyChanged(copy: RoomCopy): void {
    if (copy === this.next && copy.loaded) {
      this.copy?.destroy();
      this.copy = copy;
      this.next = undefined;
    }
    this.changed();
  }

  private aside(frame: Extract<ServerFrame, { kind: 'presence' | 'event' | 'welcome' }>): void {
    if (frame.kind === 'welcome') {
      this.people = new Map();
      this.sendPresence();
      if (this.welcomed) this.tell({ topic: '*', data: {} });
      this.welcomed = true;
    } else if (frame.kind === 'presence') {
      for (const entry of presenceEntrySchema.array().parse(JSON.parse(frame.text))) {
        if (entry.fields === null) this.people.delete(entry.connection);
        else this.people.set(entry.connection, entry);
      }
    } else {
      this.tell({ topic: frame.topic, data: JSON.parse(frame.text) as Record<string, unknown> });
    }
  }

  private tell(event: SheetEvent): void {
    for (const listener of this.eventListeners) listener(event);
  }

  private sendPresence(): void {
    (this.next ?? this.copy)?.transmit({ kind: 'presence', text: JSON.stringify(this.presence) });
  }

  private changed(): void {
    if (this.over) return;
    const after = this.view(this.copy?.doc ?? this.snapshot.doc);
    if (sameSnapshot(after, this.snapshot)) return;
    this.snapshot = after;
    for (const listener of this.listeners) listener();
  }

  private view(doc: Doc): SheetSnapshot {
    const { copy, next } = this;
    const live = next ?? copy;
    // A line without a network stays open for a while and says nothing; the browser knows at once.
    const offline = globalThis.navigator?.onLine === false ? offlineWords : live ? live.offline : 'Connecting.';
    const waiting = (copy?.outbox.waiting.length ?? 0) + (next && next !== copy ? next.outbox.waiting.length : 0);
    const everyone = [...this.people.values()];
    return {
      doc,
      loaded: copy?.loaded ?? false,
      progress: copy?.parts.progress ?? { done: 0, of: 0 },
      role: copy?.role ?? null,
      editable: copy !== undefined && copy.loaded && copy.role === 'maker' && next === undefined && !copy.frozen && copy.saving !== 'quarantined',
      save: saveMark({
        waiting, savedAt: live?.outbox.savedAt ?? null, owedSince: live?.outbox.owedSince ?? 0, offline,
        room: live?.saving ?? 'saving', roomWhy: live?.savingWhy ?? '',
      }, Date.now()),
      line: live?.ended !== undefined ? { state: 'ended', why: live.ended }
        : offline !== undefined ? { state: 'connecting', why: offline } : { state: 'open' },
      room: { state: live?.saving ?? 'saving', why: live?.savingWhy ?? '' },
      others: everyone.filter((entry) => entry.connection !== live?.connection),
      self: everyone.find((entry) => entry.connection === live?.connection) ?? null,
      refused: this.refused,
      seq: copy?.seq ?? 0,
      keptInMemoryOnly: this.memoryOnly,
    };
  }
}

function sameSnapshot(a: SheetSnapshot, b: SheetSnapshot): boolean {
  const plain = ({ doc: _doc, refused: _refused, ...rest }: SheetSnapshot) => JSON.stringify(rest);
  return a.doc === b.doc && a.refused === b.refused && plain(a) === plain(b);
}
