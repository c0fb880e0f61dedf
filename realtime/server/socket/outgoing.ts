/** What an outgoing queue needs of a socket. */
export interface FrameSink {
  readonly bufferedAmount: number;
  send(frame: Uint8Array, done: (error?: Error) => void): void;
}

const kib = 1024;
/** Handed to the socket at once; the rest waits here, so that presence can be left out while it is behind. */
const inSocket = 512 * kib;
/** Presence is left out above this. */
const presenceBound = 256 * kib;
/** A reader this far behind is sent away to come back. */
const giveUp = 8 * 1024 * kib;

/** Frames on their way to one socket, in order, without filling memory for a reader that does not read. */
export class Outgoing {
  private waiting: Uint8Array[] = [];
  private waitingBytes = 0;
  /** Bytes of a first load, which the reader is owed however large. */
  private bulkBytes = 0;

  constructor(private readonly sink: FrameSink, private readonly overflow: () => void) {}

  send(frame: Uint8Array, droppable = false): void {
    const behind = this.waitingBytes + this.sink.bufferedAmount;
    if (droppable && behind > presenceBound) return;
    if (behind - this.bulkBytes > giveUp) return this.overflow();
    this.push(frame);
  }

  /** Sends frames of a first load; they do not count as being behind. */
  sendBulk(frames: readonly Uint8Array[]): void {
    for (const frame of frames) {
      this.bulkBytes += frame.length;
      this.push(frame);
    }
  }

  private push(frame: Uint8Array): void {
    this.waiting.push(frame);
    this.waitingBytes += frame.length;
    this.pump();
  }

  private pump(): void {
    while (this.waiting.length > 0 && this.sink.bufferedAmount < inSocket) {
      const frame = this.waiting.shift() as Uint8Array;
      this.waitingBytes -= frame.length;
      this.sink.send(frame, (error) => {
        if (error) return;
        if (this.waiting.length === 0) this.bulkBytes = 0;
        this.pump();
      });
    }
  }
}
