import { describe, expect, it } from 'vitest';
import { Outgoing, type FrameSink } from './outgoing';

/** A socket whose reader reads only when told. */
class SlowSink implements FrameSink {
  readonly taken: Uint8Array[] = [];
  private readonly pending: { frame: Uint8Array; done: () => void }[] = [];

  get bufferedAmount(): number {
    return this.pending.reduce((sum, { frame }) => sum + frame.length, 0);
  }

  send(frame: Uint8Array, done: () => void): void {
    this.pending.push({ frame, done });
  }

  read(): boolean {
    const next = this.pending.shift();
    if (!next) return false;
    this.taken.push(next.frame);
    next.done();
    return true;
  }
}

const frame = (kib: number, mark: number) => new Uint8Array(kib * 1024).fill(mark);

describe('frames to a socket', () => {
  it('keep their order behind a first load', () => {
    const sink = new SlowSink();
    const out = new Outgoing(sink, () => { throw new Error('too far behind'); });
    out.sendBulk(Array.from({ length: 80 }, () => frame(256, 1)));
    out.send(frame(1, 2));
    out.send(frame(1, 3));
    expect(sink.bufferedAmount).toBeLessThan(1024 * 1024);
    while (sink.read());
    expect(sink.taken).toHaveLength(82);
    expect(sink.taken.slice(-2).map((bytes) => bytes[0])).toEqual([2, 3]);
  });

  it('of presence are left out while the reader is behind', () => {
    const sink = new SlowSink();
    const out = new Outgoing(sink, () => {});
    out.send(frame(300, 1));
    out.send(frame(1, 9), true);
    out.send(frame(1, 2));
    while (sink.read());
    expect(sink.taken.map((bytes) => bytes[0])).toEqual([1, 2]);
  });

  it('of a reader that never reads end in its being sent away', () => {
    const sink = new SlowSink();
    let away = 0;
    const out = new Outgoing(sink, () => { away += 1; });
    for (let count = 0; count < 40; count += 1) out.send(frame(256, 1));
    expect(away).toBeGreaterThan(0);
    expect(sink.bufferedAmount).toBeLessThan(1024 * 1024);
  });
});
