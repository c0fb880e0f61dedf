import { expect, it } from 'vitest';
import type { Part } from '../protocol';
import { PartBuffer } from './part-buffer';

const part = (index: number, hash = 'a', count = 3): Part => ({ kind: 'part', uptoSeq: 1, index, count, hash, bytes: Uint8Array.of(index) });

it('puts parts together, goes on after a cut, and starts over for another whole', () => {
  const buffer = new PartBuffer();
  expect(buffer.take(part(0))).toBeUndefined();
  expect(buffer.take(part(1))).toBeUndefined();
  expect(buffer.resume).toEqual({ hash: 'a', parts: 2 });
  expect(buffer.progress).toEqual({ done: 2, of: 3 });
  expect(buffer.take(part(1))).toBeUndefined();
  expect(buffer.take(part(2))).toEqual(Uint8Array.of(0, 1, 2));
  expect(buffer.resume).toEqual({ hash: '', parts: 0 });
  buffer.take(part(0));
  buffer.take(part(0, 'b', 2));
  expect(buffer.take(part(1, 'b', 2))).toEqual(Uint8Array.of(0, 1));
});
