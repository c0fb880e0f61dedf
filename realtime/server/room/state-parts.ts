import { createHash } from 'node:crypto';
import * as Y from 'yjs';
import { limits } from '@/realtime/limits';
import { encodeFrame, type Hello } from '@/realtime/protocol';

interface EncodedState {
  readonly seq: number;
  readonly bytes: Uint8Array;
  readonly hash: string;
}

/** The frames that bring a copy to a room's head. One encoded whole for each head is shared by all who join with nothing. */
export class StateParts {
  private whole: EncodedState | undefined;

  constructor(private readonly doc: Y.Doc) {}

  /**
   * Part frames for a copy with `stateVector` (empty: nothing yet). A cut-off load goes on where it stopped, as long as
   * the whole is still the same.
   * @throws Error when the state vector is not one
   */
  frames(seq: number, stateVector: Uint8Array, resume?: Hello['resume']): Uint8Array[] {
    const { bytes, hash } = this.encode(seq, stateVector);
    const count = Math.max(1, Math.ceil(bytes.length / limits.partBytes));
    const from = resume?.hash === hash && resume.parts < count ? resume.parts : 0;
    return Array.from({ length: count - from }, (_, step) => {
      const index = from + step;
      const slice = bytes.subarray(index * limits.partBytes, (index + 1) * limits.partBytes);
      return encodeFrame({ kind: 'part', uptoSeq: seq, index, count, hash, bytes: slice });
    });
  }

  private encode(seq: number, stateVector: Uint8Array): EncodedState {
    const fromNothing = Y.decodeStateVector(stateVector).size === 0;
    if (fromNothing && this.whole?.seq === seq) return this.whole;
    const bytes = Y.encodeStateAsUpdate(this.doc, stateVector);
    const state = { seq, bytes, hash: createHash('sha256').update(bytes).digest('hex') };
    if (fromNothing) this.whole = state;
    return state;
  }
}
