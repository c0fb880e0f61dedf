import { describe, expect, it } from 'vitest';
import {
  clientFrameKinds, decodeClientFrame, decodeServerFrame, encodeFrame, FrameError, frameBytes, type ClientFrame, type Frame,
  type FrameKind,
} from './protocol';

const bytes = Uint8Array.of(1, 2, 3);

const samples: { readonly [K in FrameKind]: Extract<Frame, { kind: K }> } = {
  hello: {
    kind: 'hello', ticket: 'ticket', protocol: 1, schema: 1, instance: 'copy', clientIds: [7, 4_294_967_295],
    stateVector: bytes, lastAcked: 9, resume: { hash: 'ab', parts: 3 },
  },
  welcome: {
    kind: 'welcome', role: 'reader', grantVersion: 'v', headSeq: 12, committed: 3, connection: 'c1', saving: 'saving', why: '',
    maxEditBytes: 1_000,
  },
  part: { kind: 'part', uptoSeq: 12, index: 0, count: 2, hash: 'cd', bytes },
  edit: { kind: 'edit', clientSeq: 4, bytes },
  ack: { kind: 'ack', clientSeq: 4, seq: 13 },
  nack: { kind: 'nack', clientSeq: 4, reason: 'foreign id', retry: false, words: 'Why.' },
  change: { kind: 'change', seq: 13, connection: 'c1', bytes },
  need: { kind: 'need', fromSeq: 11 },
  presence: { kind: 'presence', text: '{}' },
  state: { kind: 'state', saving: 'not saving', why: 'The database does not answer.', committed: 2 },
  event: { kind: 'event', topic: 'threads', text: '{"id":"x"}' },
  ping: { kind: 'ping', at: 1_790_000_000_000 },
  pong: { kind: 'pong', at: 1 },
};

describe('frames', () => {
  it.each(Object.values(samples))('$kind survives the way over', (frame) => {
    expect(decodeServerFrame(encodeFrame(frame))).toEqual(frame);
  });

  it.each(Object.keys(samples) as FrameKind[])('%s from a client is taken only when a client may send it', (kind) => {
    const read = () => decodeClientFrame(encodeFrame(samples[kind]));
    if ((clientFrameKinds as readonly string[]).includes(kind)) expect(read()).toEqual(samples[kind]);
    else expect(read).toThrow(FrameError);
  });

  it('refuses bytes left over and frames cut short', () => {
    for (const kind of clientFrameKinds) {
      const whole = encodeFrame(samples[kind] as ClientFrame);
      expect(() => decodeClientFrame(Uint8Array.of(...whole, 0))).toThrow(FrameError);
      for (let end = 0; end < whole.length; end += 1) {
        expect(() => decodeClientFrame(whole.subarray(0, end)), `${kind} cut at ${end}`).toThrow(FrameError);
      }
    }
  });

  it('meets random bytes with FrameError and nothing else', () => {
    let seed = 20_261_201;
    const random = () => (seed = (Math.imul(seed, 1_664_525) + 1_013_904_223) >>> 0) / 2 ** 32;
    const kinds = Object.values(frameBytes);
    for (let round = 0; round < 20_000; round += 1) {
      const noise = Uint8Array.from({ length: Math.floor(random() * 60) }, () => Math.floor(random() * 256));
      if (noise.length > 0 && random() < 0.8) noise[0] = kinds[Math.floor(random() * kinds.length)] ?? 0;
      try {
        decodeClientFrame(noise);
      } catch (error) {
        expect(error).toBeInstanceOf(FrameError);
      }
    }
  });
});
