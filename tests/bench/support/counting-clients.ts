import { WebSocket } from 'ws';

/** Sockets whose frames are counted, not decoded, and a promise for "everyone has the next one": no polling, no timers. */
export class CountingClients {
  private readonly counts: number[];
  private waiting: { readonly count: number; readonly done: () => void } | undefined;

  /** `counted` says by its first byte whether a frame counts. */
  constructor(private readonly sockets: readonly WebSocket[], counted: (firstByte: number) => boolean = () => true) {
    this.counts = sockets.map(() => 0);
    for (const [index, socket] of sockets.entries()) {
      socket.on('message', (bytes: Buffer) => {
        if (!counted(bytes[0] ?? -1)) return;
        this.counts[index] = (this.counts[index] ?? 0) + 1;
        this.look();
      });
    }
  }

  /** Resolves when every socket has had `count` frames. */
  all(count: number): Promise<void> {
    return new Promise((done) => {
      this.waiting = { count, done };
      this.look();
    });
  }

  close(): void {
    for (const socket of this.sockets) socket.terminate();
  }

  private look(): void {
    const { waiting } = this;
    if (!waiting || !this.counts.every((count) => count >= waiting.count)) return;
    this.waiting = undefined;
    waiting.done();
  }
}

/** An open socket, uncompressed as the rooms' are. */
export function openSocket(url: string, protocols: readonly string[] = [], origin?: string): Promise<WebSocket> {
  const socket = new WebSocket(url, [...protocols], { perMessageDeflate: false, ...(origin ? { origin } : {}) });
  socket.binaryType = 'nodebuffer';
  return new Promise((resolve, reject) => {
    socket.once('open', () => resolve(socket));
    socket.once('error', reject);
  });
}
