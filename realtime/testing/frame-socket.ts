import { WebSocket } from 'ws';
import { limits, protocolVersion, schemaVersion, subprotocol } from '../limits';
import { decodeServerFrame, encodeFrame, type ClientFrame, type Hello, type ServerFrame } from '../protocol';
import { waitFor } from './wait-for';

export interface SocketOptions {
  readonly origin?: string | undefined;
  readonly protocols?: readonly string[];
  readonly headers?: Readonly<Record<string, string>>;
}

/** A sheet socket spoken to frame by frame, for tests: it does nothing by itself but answer pings. */
export class FrameSocket {
  readonly frames: ServerFrame[] = [];
  closed: { readonly code: number; readonly reason: string } | undefined;
  /** HTTP status when the upgrade was refused. */
  refused: number | undefined;
  private readonly socket: WebSocket;

  constructor(url: string, { origin, protocols = [subprotocol], headers = {} }: SocketOptions = {}) {
    this.socket = new WebSocket(url, [...protocols], { headers: { ...headers }, ...(origin === undefined ? {} : { origin }), perMessageDeflate: false });
    this.socket.binaryType = 'nodebuffer';
    this.socket.on('unexpected-response', (_request, response) => {
      this.refused = response.statusCode;
      response.destroy();
    });
    this.socket.on('error', () => {});
    this.socket.on('close', (code, reason) => {
      this.closed = { code, reason: reason.toString() };
    });
    this.socket.on('message', (data: Buffer) => {
      const frame = decodeServerFrame(new Uint8Array(data));
      this.frames.push(frame);
      if (frame.kind === 'ping') this.send({ kind: 'pong', at: frame.at });
    });
  }

  async opened(): Promise<this> {
    await waitFor('the socket to open', () => this.socket.readyState === WebSocket.OPEN || this.refused !== undefined);
    return this;
  }

  send(frame: ClientFrame): void {
    this.sendBytes(encodeFrame(frame));
  }

  sendBytes(bytes: Uint8Array | string): void {
    this.socket.send(bytes);
  }

  hello(ticket: string, more: Partial<Hello> = {}): void {
    this.send({
      kind: 'hello', ticket, protocol: protocolVersion, schema: schemaVersion, instance: 'instance-of-a-test', clientIds: [],
      stateVector: Uint8Array.of(0), lastAcked: 0, resume: { hash: '', parts: 0 }, ...more,
    });
  }

  of<K extends ServerFrame['kind']>(kind: K): Extract<ServerFrame, { kind: K }>[] {
    return this.frames.filter((frame): frame is Extract<ServerFrame, { kind: K }> => frame.kind === kind);
  }

  /** The first frame of a kind that `fits`, now or later. */
  next<K extends ServerFrame['kind']>(
    kind: K, fits: (frame: Extract<ServerFrame, { kind: K }>) => boolean = () => true, timeout?: number,
  ): Promise<Extract<ServerFrame, { kind: K }>> {
    return waitFor(`a frame of kind ${kind}`, () => this.of(kind).find(fits), timeout);
  }

  closing(timeout?: number): Promise<{ code: number; reason: string }> {
    return waitFor('the socket to close', () => this.closed, timeout);
  }

  /** The sheet as one update, once all its parts are here. */
  async whole(): Promise<Uint8Array> {
    const welcome = await this.next('welcome');
    const parts = await waitFor('all parts', () => {
      const here = this.of('part');
      return here.length > 0 && here.length === here[0]?.count && here;
    });
    if (parts.some((part) => part.bytes.length > limits.partBytes) || parts[0]?.uptoSeq !== welcome.headSeq) throw new Error('The parts are not as agreed.');
    return Buffer.concat(parts.map((part) => part.bytes));
  }

  /** Cuts the line without a closing handshake. */
  cut(): void {
    this.socket.terminate();
  }

  pause(): void {
    this.socket.pause();
  }
}
