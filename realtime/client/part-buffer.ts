import type { Hello, Part } from '../protocol';

/** The parts of a sheet on their way here; what arrived before a cut is kept and not asked for again. */
export class PartBuffer {
  private hash = '';
  private parts: Uint8Array[] = [];
  private count = 0;

  /** For hello: where a first load that was cut off goes on. */
  get resume(): Hello['resume'] {
    return { hash: this.hash, parts: this.parts.length };
  }

  get progress(): { readonly done: number; readonly of: number } {
    return { done: this.parts.length, of: this.count };
  }

  /** Takes a part in; gives the whole once it is there. */
  take(part: Part): Uint8Array | undefined {
    if (part.hash !== this.hash || part.index > this.parts.length) {
      this.hash = part.hash;
      this.parts = [];
    }
    this.count = part.count;
    if (part.index === this.parts.length) this.parts.push(part.bytes);
    if (this.parts.length < part.count) return undefined;
    const whole = new Uint8Array(this.parts.reduce((sum, bytes) => sum + bytes.length, 0));
    let at = 0;
    for (const bytes of this.parts) {
      whole.set(bytes, at);
      at += bytes.length;
    }
    this.hash = '';
    this.parts = [];
    return whole;
  }
}
