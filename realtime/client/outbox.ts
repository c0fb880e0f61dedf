import * as Y from 'yjs';
import { maxEditBytes } from '../limits';
import type { NackReason } from '../protocol';
import type { EditScope, EditStore, RefusedEdit, WaitingEdit } from './edit-store';

/** Unanswered edits that may be with the server; it takes up to 256. */
const inFlight = 200;

const writersOf = (update: Uint8Array) => new Set(Y.decodeUpdate(update).structs.map((struct) => struct.id.client));

/**
 * Numbers the edits of one copy, keeps each until the server says that it is committed, and sends them in order. Provider
 * and socket come and go; the numbers stay, so that an edit sent twice is taken once.
 */
export class Outbox {
  private readonly edits = new Map<number, WaitingEdit>();
  private last = 0;
  private sent = 0;
  private transmit: ((clientSeq: number, bytes: Uint8Array) => void) | undefined;
  /** When the last edit was acknowledged, ms since 1970; null before the first. */
  savedAt: number | null = null;

  constructor(
    private readonly store: EditStore,
    private readonly scope: EditScope,
    readonly instance: string,
    private readonly changed: () => void,
    private readonly storeFailed: (error: unknown) => void,
  ) {}

  /** Takes over edits that an earlier page left; they are numbered and stored already. */
  takeOver(edits: readonly WaitingEdit[]): void {
    for (const edit of edits) {
      this.edits.set(edit.clientSeq, edit);
      this.last = Math.max(this.last, edit.clientSeq);
    }
  }

  get waiting(): readonly WaitingEdit[] {
    return [...this.edits.values()];
  }

  get acknowledged(): number {
    return this.last - this.edits.size;
  }

  /** Since when the server owes an answer, ms since 1970. */
  owedSince = 0;

  /** Yjs client ids under which waiting edits bring structs. */
  writers(): number[] {
    return [...new Set(this.waiting.flatMap(({ bytes }) => [...writersOf(bytes)]))];
  }

  /** Numbers, keeps and sends an edit. False when it is too large to be sent at all: refuse it. */
  add(bytes: Uint8Array, at = Date.now()): { readonly clientSeq: number; readonly fits: boolean } {
    const edit = { clientSeq: (this.last += 1), bytes, at };
    if (this.edits.size === 0) this.owedSince = at;
    this.edits.set(edit.clientSeq, edit);
    this.store.put(this.scope, this.instance, edit).catch(this.storeFailed);
    const fits = bytes.length <= maxEditBytes;
    if (fits) this.pump();
    this.changed();
    return { clientSeq: edit.clientSeq, fits };
  }

  /** Sends what is not committed through a new socket, or after an outage once more through the same one. */
  start(committed: number, transmit: (clientSeq: number, bytes: Uint8Array) => void): void {
    this.transmit = undefined;
    this.acknowledge(committed);
    this.sent = committed;
    this.owedSince = Date.now();
    this.transmit = transmit;
    this.pump();
  }

  stop(): void {
    this.transmit = undefined;
  }

  /** The server committed everything up to `clientSeq`. */
  acknowledge(clientSeq: number): void {
    let any = false;
    for (const seq of this.edits.keys()) {
      if (seq > clientSeq) break;
      any = this.edits.delete(seq);
    }
    if (!any) return;
    this.savedAt = Date.now();
    this.owedSince = this.savedAt;
    this.store.removeUpTo(this.scope, this.instance, clientSeq).catch(this.storeFailed);
    this.pump();
    this.changed();
  }

  /** Takes a refused edit out of waiting, with those after it that lean on it, and keeps them as refused. */
  async refuse(clientSeq: number, reason: NackReason, words: string): Promise<RefusedEdit | undefined> {
    const edit = this.edits.get(clientSeq);
    if (!edit) return undefined;
    const writers = writersOf(edit.bytes);
    const leaning = this.waiting.filter((later) => later.clientSeq > clientSeq && [...writersOf(later.bytes)].some((id) => writers.has(id)));
    const all = [edit, ...leaning];
    for (const { clientSeq: seq } of all) this.edits.delete(seq);
    const refused: RefusedEdit = {
      id: `${this.instance} ${clientSeq}`, reason, words, at: Date.now(), updates: all.map(({ bytes }) => bytes),
    };
    await this.store.refuse(this.scope, this.instance, all.map(({ clientSeq: seq }) => seq), refused).catch(this.storeFailed);
    this.changed();
    return refused;
  }

  private pump(): void {
    if (!this.transmit) return;
    for (const [seq, { bytes }] of this.edits) {
      if (seq <= this.sent) continue;
      if (seq !== this.sent + 1 || seq - this.acknowledged > inFlight || bytes.length > maxEditBytes) return;
      this.sent = seq;
      this.transmit(seq, bytes);
    }
  }
}
