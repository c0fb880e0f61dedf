import { Awareness } from 'y-protocols/awareness';
import { WebsocketProvider } from 'y-websocket';
import * as Y from 'yjs';
import { afterClose, closeCodes } from '../close-codes';
import { protocolVersion, schemaVersion } from '../limits';
import { type ClientFrame, type RoomRole, type RoomSaving, type ServerFrame } from '../protocol';
import type { RefusedEdit } from './edit-store';
import type { Outbox } from './outbox';
import { PartBuffer } from './part-buffer';
import { SheetSocket, shouldReconnect, type SocketOwner, type TicketAnswer } from './sheet-socket';

export interface CopyHost {
  fetchTicket(): Promise<TicketAnswer>;
  readonly WebSocket: typeof WebSocket;
  /** Longest pause between two tries, milliseconds. */
  readonly longestPause: number;
  changed(): void;
  /** A frame that is about people or pages, not about the sheet. */
  aside(frame: Extract<ServerFrame, { kind: 'presence' | 'event' | 'welcome' }>): void;
  refused(edit: RefusedEdit): void;
  /** This copy holds what the server does not: a fresh one must take its place. */
  spoiled(): void;
}

/** Origin of edits that an earlier page left: they are numbered and stored already. */
const keptEdits = 'kept edits';
/** A restarting server spreads its clients over at most this long, milliseconds. */
const longestSpread = 10_000;

/** One copy of a sheet in this page: its document, its edits on their way out, its line to the server. */
export class RoomCopy implements SocketOwner {
  readonly doc = new Y.Doc();
  readonly WebSocket: typeof WebSocket;
  loaded = false;
  role: RoomRole | null = null;
  connection = '';
  saving: RoomSaving = 'saving';
  savingWhy = '';
  /** Why there is no line now; undefined while there is one. */
  offline: string | undefined = 'Connecting.';
  /** Set when it will not be tried again. */
  ended: string | undefined;
  /** Seq up to which this copy holds every committed edit. */
  seq = 0;
  readonly parts = new PartBuffer();
  private readonly provider: WebsocketProvider;
  private socket: SheetSocket | undefined;
  private registered = new Set<number>();
  private asking = false;
  /** True once an edit was refused: what is made here from now on leans on it. */
  frozen = false;
  private spoiled = false;
  private welcomeCommitted = 0;
  /** Longest random pause before dialling again, told by a server that restarts; milliseconds. */
  private restartSpread = 0;

  constructor(private readonly host: CopyHost, readonly outbox: Outbox) {
    this.WebSocket = host.WebSocket;
    const awareness = new Awareness(this.doc);
    awareness.setLocalState(null);
    this.provider = new WebsocketProvider('sheet:', 'sheet', this.doc, {
      connect: false, disableBc: true, awareness, maxBackoffTime: host.longestPause, shouldReconnect,
      WebSocketPolyfill: socketFor(this),
    });
    this.doc.on('update', (update: Uint8Array, origin: unknown) => {
      if (origin !== this.provider && origin !== keptEdits) this.edited(update);
    });
    this.provider.connect();
  }

  fetchTicket(): Promise<TicketAnswer> {
    return this.host.fetchTicket();
  }

  delay(): number {
    return Math.random() * this.restartSpread;
  }

  hello(ticket: string): Extract<ClientFrame, { kind: 'hello' }> {
    const clientIds = [...new Set([this.doc.clientID, ...this.outbox.writers()])].slice(0, 64);
    this.registered = new Set(clientIds);
    return {
      kind: 'hello', ticket, protocol: protocolVersion, schema: schemaVersion, instance: this.outbox.instance, clientIds,
      stateVector: Y.encodeStateVector(this.doc), lastAcked: this.outbox.acknowledged, resume: this.parts.resume,
    };
  }

  take(frame: ServerFrame, socket: SheetSocket): void {
    this.socket = socket;
    switch (frame.kind) {
      case 'welcome':
        this.offline = undefined;
        this.restartSpread = 0;
        this.asking = false;
        this.role = frame.role;
        this.connection = frame.connection;
        this.saving = frame.saving;
        this.savingWhy = frame.why;
        this.welcomeCommitted = frame.committed;
        this.host.aside(frame);
        break;
      case 'part': return this.takePart(frame, socket);
      case 'change':
        if (this.advance(frame.seq)) socket.giveUpdate(frame.bytes);
        break;
      case 'ack':
        this.advance(frame.seq);
        this.outbox.acknowledge(frame.clientSeq);
        break;
      case 'nack':
        void this.refuse(frame);
        break;
      case 'state':
        this.saving = frame.saving;
        this.savingWhy = frame.why;
        if (frame.saving === 'saving' && this.loaded) this.sendFrom(frame.committed);
        break;
      case 'presence':
      case 'event':
        this.host.aside(frame);
        break;
      case 'ping':
      case 'pong': return;
    }
    this.host.changed();
  }

  closed(code: number, words: string | undefined, detail: string): void {
    this.outbox.stop();
    this.socket = undefined;
    this.offline = words ?? 'No connection to the server.';
    this.restartSpread = code === closeCodes.restarting.code ? Math.min(longestSpread, Number(/\d+/.exec(detail)?.[0] ?? longestSpread)) : 0;
    const then = afterClose(code);
    if (code === closeCodes.tooBig.code && this.outbox.waiting.length > 0) void this.refuseLargest();
    else if (then === 'stop') this.ended = words ?? 'The server closed this sheet.';
    else if (then === 'reload' && !this.frozen) this.spoil();
    this.host.changed();
  }

  transmit(frame: ClientFrame): void {
    this.socket?.transmit(frame);
  }

  /** Takes the line down; what waits stays in the store. */
  hangUp(): void {
    this.provider.disconnect();
  }

  /** Dials again at once. */
  reconnect(): void {
    this.ended = undefined;
    this.provider.connect();
  }

  /** Ends the line and lets go of the document; waiting edits stay in the store. */
  destroy(): void {
    this.outbox.stop();
    this.provider.destroy();
    this.provider.awareness.destroy();
    this.doc.destroy();
  }

  private takePart(frame: Extract<ServerFrame, { kind: 'part' }>, socket: SheetSocket): void {
    const whole = this.parts.take(frame);
    if (whole) {
      socket.giveState(whole);
      this.seq = Math.max(this.seq, frame.uptoSeq);
      this.asking = false;
      if (!this.loaded) for (const { bytes } of this.outbox.waiting) Y.applyUpdate(this.doc, bytes, keptEdits);
      this.loaded = true;
      this.sendFrom(this.welcomeCommitted);
    }
    this.host.changed();
  }

  private sendFrom(committed: number): void {
    this.outbox.start(committed, (clientSeq, bytes) => this.transmit({ kind: 'edit', clientSeq, bytes }));
  }

  /** True when `seq` is the next committed edit; a hole makes the server send what is missing. */
  private advance(seq: number): boolean {
    if (seq <= this.seq) return false;
    if (seq === this.seq + 1) {
      this.seq = seq;
      this.asking = false;
      return true;
    }
    if (!this.asking) this.transmit({ kind: 'need', fromSeq: this.seq + 1 });
    this.asking = true;
    return false;
  }

  private edited(update: Uint8Array): void {
    const { clientSeq, fits } = this.outbox.add(update);
    if (this.frozen) void this.outbox.refuse(clientSeq, 'gap', 'Made on a copy that had to be opened anew.').then((edit) => edit && this.host.refused(edit));
    else if (!fits) void this.refuse({ clientSeq, reason: 'size', words: 'This edit is too big to send in one piece. Paste or import less at once.' });
    // Yjs takes another client id when it meets its own in somebody's edit; the server must know it before the next one.
    else if (this.socket && !this.registered.has(this.doc.clientID)) this.socket.close(4000);
  }

  private async refuse({ clientSeq, reason, words }: Pick<Extract<ServerFrame, { kind: 'nack' }>, 'clientSeq' | 'reason' | 'words'>): Promise<void> {
    this.frozen = true;
    const edit = await this.outbox.refuse(clientSeq, reason, words);
    if (edit) this.host.refused(edit);
    this.spoil();
  }

  private async refuseLargest(): Promise<void> {
    const [largest] = [...this.outbox.waiting].sort((a, b) => b.bytes.length - a.bytes.length);
    if (largest) await this.refuse({ clientSeq: largest.clientSeq, reason: 'size', words: closeCodes.tooBig.words });
  }

  private spoil(): void {
    this.frozen = true;
    if (this.spoiled) return;
    this.spoiled = true;
    this.host.spoiled();
  }
}

/** The provider constructs its sockets itself: it gets a class whose sockets all serve one copy. */
function socketFor(owner: SocketOwner): typeof WebSocket {
  return class extends SheetSocket {
    constructor() {
      super(owner);
    }
  } as unknown as typeof WebSocket;
}
