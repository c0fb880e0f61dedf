import { rowActorKey, type RowActor, type RowToAppend } from '@/db/mutations/room-append';
import type { NackReason } from '@/realtime/protocol';
import type { RoomInstance } from './room-instance';
import type { SheetCandidate, Verdict } from './sheet-candidate';

export type EditOutcome =
  | { readonly kind: 'committed'; readonly seq: number }
  | { readonly kind: 'refused'; readonly reason: NackReason; readonly words: string }
  /** The actor's grant is no longer the one it was let in with. */
  | { readonly kind: 'grant changed' }
  /** The database failed; whether the edit is stored shows after recovery. */
  | { readonly kind: 'unavailable' };

/** An edit that was admitted and waits for its commit. */
export interface QueuedEdit {
  readonly instance: RoomInstance;
  readonly clientSeq: number;
  readonly actor: RowActor;
  readonly bytes: Uint8Array;
  electrical: boolean;
  /** Connection that made it; empty for an edit over HTTP. */
  readonly connection: string;
  readonly mayWrite: (clientId: number) => boolean;
  /** Told once. */
  readonly settle: (outcome: EditOutcome) => void;
}

/** Rows and bytes of one transaction; well under MariaDB's default packet of 16 MiB. */
const batchRows = 128;
const batchBytes = 4 * 1024 * 1024;

/** Admitted edits in the order in which they get their seq. Those being committed stay in front until it is known. */
export class EditQueue {
  private edits: QueuedEdit[] = [];

  get length(): number {
    return this.edits.length;
  }

  push(edit: QueuedEdit): void {
    this.edits.push(edit);
  }

  /** The next transaction's edits; they stay queued. */
  nextBatch(): readonly QueuedEdit[] {
    const batch: QueuedEdit[] = [];
    let bytes = 0;
    for (const edit of this.edits) {
      bytes += edit.bytes.length;
      if (batch.length > 0 && (batch.length === batchRows || bytes > batchBytes)) break;
      batch.push(edit);
    }
    return batch;
  }

  /** Takes the first `count` edits off: they are committed. */
  shift(count: number): void {
    this.edits.splice(0, count);
  }

  /** Takes every edit off. */
  drain(): readonly QueuedEdit[] {
    return this.edits.splice(0);
  }

  /** Takes off the edits of these actors. */
  takeActors(actors: readonly RowActor[]): readonly QueuedEdit[] {
    const keys = new Set(actors.map(rowActorKey));
    const taken = this.edits.filter((edit) => keys.has(rowActorKey(edit.actor)));
    this.edits = this.edits.filter((edit) => !keys.has(rowActorKey(edit.actor)));
    return taken;
  }

  /**
   * Tries every edit on `candidate` again. The first that no longer fits is taken off with those that its copy made after
   * it; undefined when all fit.
   */
  readmit(candidate: SheetCandidate): Misfit | undefined {
    for (const [index, edit] of this.edits.entries()) {
      const verdict = candidate.admit(edit.bytes, edit.mayWrite);
      if (!verdict.ok) {
        const followers = this.edits.slice(index + 1).filter((later) => later.instance === edit.instance);
        this.edits = this.edits.filter((other) => other !== edit && !followers.includes(other));
        return { edit, verdict, followers };
      }
      edit.electrical = verdict.electrical;
    }
    return undefined;
  }
}

export interface Misfit {
  readonly edit: QueuedEdit;
  readonly verdict: Extract<Verdict, { ok: false }>;
  readonly followers: readonly QueuedEdit[];
}

export function rowOf(edit: QueuedEdit): RowToAppend {
  const { clientSeq, actor, electrical, bytes } = edit;
  return { instanceId: edit.instance.id, clientSeq, actor, electrical, bytes };
}
