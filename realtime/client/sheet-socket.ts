import { afterClose, closeCodes, closeReasonOf } from '../close-codes';
import { decodeServerFrame, encodeFrame, type ClientFrame, type ServerFrame } from '../protocol';
import { subprotocol } from '../limits';
import { asksForState, signOfLife, stateMessage, updateMessage } from './provider-messages';

/** A right to open one room, from `POST /api/circuits/{id}/room-ticket`; or why there is none. */
export type TicketAnswer = { readonly ticket: string; readonly url: string } | { readonly refused: string };

/** What a socket needs from the copy it serves, and tells it. */
export interface SocketOwner {
  /** Rejects when the server cannot be asked now: it is tried again. */
  fetchTicket(): Promise<TicketAnswer>;
  /** The first frame, made when the line is open. */
  hello(ticket: string): Extract<ClientFrame, { kind: 'hello' }>;
  /** Every frame but pings, in order. */
  take(frame: ServerFrame, socket: SheetSocket): void;
  /** `detail` is the reason the server gave with the code. */
  closed(code: number, words: string | undefined, detail: string): void;
  /** Milliseconds to wait before dialling again. */
  delay(): number;
  readonly WebSocket: typeof WebSocket;
}

interface SocketEvent { readonly code: number; readonly reason: string }

const normalClosure = 1000;
const lostConnection = 1006;

/**
 * What the y-websocket provider takes for its WebSocket. It fetches a ticket, dials, says hello, and is 'open' only after
 * `welcome`; it answers the provider's question for the sheet from the part frames and hands committed edits on as updates.
 * What the provider sends besides is dropped: edits leave through the outbox, which keeps them while no provider listens.
 */
export class SheetSocket {
  static readonly CONNECTING = 0;
  static readonly OPEN = 1;
  static readonly CLOSING = 2;
  static readonly CLOSED = 3;
  readonly OPEN = SheetSocket.OPEN;
  binaryType = 'arraybuffer';
  readyState: number = SheetSocket.CONNECTING;
  onopen: (() => void) | null = null;
  onclose: ((event: SocketEvent) => void) | null = null;
  onerror: ((event: unknown) => void) | null = null;
  onmessage: ((event: { readonly data: Uint8Array }) => void) | null = null;
  private line: WebSocket | undefined;
  private asked = false;
  private answered = false;
  private state: Uint8Array | undefined;

  constructor(private readonly owner: SocketOwner) {
    setTimeout(() => void this.dial(), owner.delay());
  }

  /** What the provider sends. */
  send(message: Uint8Array): void {
    if (!asksForState(message)) return;
    this.asked = true;
    this.answer();
  }

  transmit(frame: ClientFrame): void {
    if (this.line?.readyState === SheetSocket.OPEN) this.line.send(encodeFrame(frame) as Uint8Array<ArrayBuffer>);
  }

  /** The sheet as the server has it: the answer to the provider's question, later on an update like any other. */
  giveState(update: Uint8Array): void {
    if (this.answered) return this.deliver(updateMessage(update));
    this.state = update;
    this.answer();
  }

  giveUpdate(update: Uint8Array): void {
    this.deliver(updateMessage(update));
  }

  close(code = normalClosure): void {
    if (this.readyState >= SheetSocket.CLOSING) return;
    this.readyState = SheetSocket.CLOSING;
    this.line?.close(code);
    this.end(lostConnection, undefined);
  }

  private async dial(): Promise<void> {
    if (this.readyState !== SheetSocket.CONNECTING) return;
    try {
      const answer = await this.owner.fetchTicket();
      if (this.isOver()) return;
      if ('refused' in answer) return this.end(closeCodes.accessGone.code, answer.refused);
      const line = new this.owner.WebSocket(answer.url, [subprotocol]);
      line.binaryType = 'arraybuffer';
      line.onopen = () => line.send(encodeFrame(this.owner.hello(answer.ticket)) as Uint8Array<ArrayBuffer>);
      line.onmessage = ({ data }: MessageEvent<ArrayBuffer>) => this.receive(new Uint8Array(data));
      line.onerror = () => {};
      line.onclose = ({ code, reason }) => this.end(code, wordsOf(code), reason);
      this.line = line;
    } catch {
      this.end(lostConnection, undefined);
    }
  }

  private receive(bytes: Uint8Array): void {
    if (this.isOver()) return;
    const frame = decodeServerFrame(bytes);
    if (frame.kind === 'ping') {
      this.transmit({ kind: 'pong', at: frame.at });
      this.deliver(signOfLife);
      return;
    }
    if (frame.kind === 'part') this.deliver(signOfLife);
    this.owner.take(frame, this);
    if (frame.kind === 'welcome') {
      this.readyState = SheetSocket.OPEN;
      this.onopen?.();
    }
  }

  private answer(): void {
    if (!this.asked || this.state === undefined) return;
    this.answered = true;
    this.deliver(stateMessage(this.state));
    this.state = undefined;
  }

  private deliver(data: Uint8Array): void {
    if (this.readyState === SheetSocket.OPEN) this.onmessage?.({ data });
  }

  private isOver(): boolean {
    return this.readyState >= SheetSocket.CLOSING;
  }

  private end(code: number, words: string | undefined, detail = ''): void {
    if (this.readyState === SheetSocket.CLOSED) return;
    this.readyState = SheetSocket.CLOSED;
    if (this.line) this.line.onmessage = null;
    this.owner.closed(code, words, detail);
    this.onclose?.({ code, reason: words ?? '' });
  }
}

function wordsOf(code: number): string | undefined {
  const reason = closeReasonOf(code);
  return reason && closeCodes[reason].words;
}

/** For the provider: whether it dials again after this close. A refused edit needs a fresh copy first. */
export const shouldReconnect = (event: { readonly code: number }) => afterClose(event.code) === 'retry';
