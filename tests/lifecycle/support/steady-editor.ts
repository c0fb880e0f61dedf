import { randomBytes } from 'node:crypto';
import * as Y from 'yjs';
import { FrameSocket } from '@/realtime/testing/frame-socket';
import { SheetCopy } from '@/realtime/testing/sheet-copy';
import type { SignedInPerson } from '../../support/signed-in-person';

interface Sent {
  readonly ref: string;
  readonly clientSeq: number;
  readonly bytes: Uint8Array;
}

/**
 * Adds resistors one after the other to a sheet, whatever happens to the server: keeps each edit until it is acknowledged and
 * sends it again under its old number after every new connection, as a page does.
 */
export class SteadyEditor {
  readonly acknowledged = new Set<string>();
  private readonly instance = randomBytes(16).toString('base64url');
  private readonly copy = new SheetCopy();
  private unacknowledged: Sent[] = [];
  private clientSeq = 0;
  private heard = 0;
  private stopping = false;
  private running: Promise<void> = Promise.resolve();

  constructor(private readonly person: SignedInPerson, private readonly circuit: string) {}

  start(): void {
    this.running = this.run();
  }

  /** Ends once everything that was sent is acknowledged. */
  async finish(): Promise<void> {
    this.stopping = true;
    await this.running;
  }

  private async run(): Promise<void> {
    while (!this.stopping || this.unacknowledged.length > 0) {
      try {
        await this.session();
      } catch {
        // The server is away: try again shortly, as a page does.
        await new Promise((resolve) => setTimeout(resolve, 100));
      }
    }
  }

  private async session(): Promise<void> {
    const { ticket, url } = await this.person.call<{ ticket: string; url: string }>('POST', `/api/circuits/${this.circuit}/room-ticket`, {});
    const socket = await new FrameSocket(url, { origin: this.person.address }).opened();
    try {
      socket.hello(ticket, {
        instance: this.instance, clientIds: [this.copy.clientId], stateVector: Y.encodeStateVector(this.copy.doc),
        lastAcked: this.clientSeq - this.unacknowledged.length,
      });
      const welcome = await socket.next('welcome', undefined, 5_000);
      if (welcome.role !== 'maker') throw new Error('Not let in as a maker.');
      this.copy.receive(await socket.whole());
      this.take(welcome.committed);
      this.heard = 0;
      this.sendAgain(socket);
      while (!this.stopping || this.unacknowledged.length > 0) await this.turn(socket);
    } finally {
      socket.cut();
    }
  }

  private async turn(socket: FrameSocket): Promise<void> {
    if (!this.stopping && this.unacknowledged.length < 4) {
      const ref = `R${this.clientSeq + 1}`;
      const sent = { ref, clientSeq: (this.clientSeq += 1), bytes: this.copy.addResistor(ref) };
      this.unacknowledged.push(sent);
      socket.send({ kind: 'edit', clientSeq: sent.clientSeq, bytes: sent.bytes });
    }
    await new Promise((resolve) => setTimeout(resolve, 20));
    if (socket.closed) throw new Error(`Closed with ${socket.closed.code}.`);
    const refused = socket.of('nack').find((nack) => !nack.retry);
    if (refused) throw new Error(`Refused: ${refused.words}`);
    this.take(Math.max(0, ...socket.of('ack').map((ack) => ack.clientSeq)));
    this.heed(socket);
  }

  /** After a time of not saving the server says where it stands; what is not committed is sent again. */
  private heed(socket: FrameSocket): void {
    const states = socket.of('state');
    const fresh = states.slice(this.heard);
    this.heard = states.length;
    for (const { saving, committed } of fresh) {
      this.take(committed);
      if (saving === 'saving') this.sendAgain(socket);
    }
  }

  private sendAgain(socket: FrameSocket): void {
    for (const { clientSeq, bytes } of this.unacknowledged) socket.send({ kind: 'edit', clientSeq, bytes });
  }

  private take(committed: number): void {
    for (const { ref } of this.unacknowledged.filter(({ clientSeq }) => clientSeq <= committed)) this.acknowledged.add(ref);
    this.unacknowledged = this.unacknowledged.filter(({ clientSeq }) => clientSeq > committed);
  }
}
