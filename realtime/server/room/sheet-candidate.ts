import * as Y from 'yjs';
import { admitUpdate, type RefusalReason } from '@/lib/document/admission/admit-update';
import type { NackReason } from '@/realtime/protocol';
import { ElectricalWatch } from './electrical-watch';

export type Verdict =
  | { readonly ok: true; readonly electrical: boolean }
  | { readonly ok: false; readonly reason: NackReason; readonly words: string };

const nackReasonOf: Readonly<Record<RefusalReason, NackReason>> = { undecodable: 'bytes', gap: 'gap', schema: 'schema', size: 'size' };

/** Yjs client ids under which an update brings structs, or undefined when it cannot be read. */
export function writersOf(update: Uint8Array): number[] | undefined {
  try {
    return [...new Set(Y.decodeUpdate(update).structs.map((struct) => struct.id.client))];
  } catch {
    return undefined;
  }
}

/**
 * A second copy of a sheet on which edits are tried before they are stored: nothing reaches the committed copy, the log or
 * other people unless it was taken here. After a refusal the copy is tainted and must be built anew.
 */
export class SheetCandidate {
  private readonly doc: Y.Doc;
  private readonly watch: ElectricalWatch;

  constructor(committed: Y.Doc, contentHash: (doc: Y.Doc) => string) {
    this.doc = new Y.Doc();
    Y.applyUpdate(this.doc, Y.encodeStateAsUpdate(committed));
    this.watch = new ElectricalWatch(this.doc, contentHash);
  }

  /** Tries one update. `mayWrite` says whose structs it may bring; deletions may name anyone's. */
  admit(update: Uint8Array, mayWrite: (clientId: number) => boolean): Verdict {
    const writers = writersOf(update);
    if (!writers) return { ok: false, reason: 'bytes', words: 'This edit cannot be read.' };
    if (!writers.every(mayWrite)) {
      return { ok: false, reason: 'foreign id', words: 'This edit claims to come from another person\'s page.' };
    }
    const admission = admitUpdate(this.doc, update);
    if (!admission.ok) return { ok: false, reason: nackReasonOf[admission.reason], words: admission.words };
    return { ok: true, electrical: admission.changed && this.watch.changed() };
  }

  destroy(): void {
    this.doc.destroy();
  }
}
