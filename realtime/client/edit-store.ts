import type { NackReason } from '../protocol';

/** Whose edits of which sheet: one person's edits are never sent as another's on a shared machine. */
export interface EditScope {
  readonly personId: string;
  readonly circuitId: string;
}

/** An edit that the server has not acknowledged. */
export interface WaitingEdit {
  readonly clientSeq: number;
  /** The Yjs update. */
  readonly bytes: Uint8Array;
  /** When it was made, ms since 1970. */
  readonly at: number;
}

/** Edits that the server will not take as they are; kept until their author has tried again or let go of them. */
export interface RefusedEdit {
  readonly id: string;
  readonly reason: NackReason;
  /** For people: what was refused and why. */
  readonly words: string;
  /** When it was refused, ms since 1970. */
  readonly at: number;
  /** The Yjs updates: the refused one and those that lean on it, in the order in which they were made. */
  readonly updates: readonly Uint8Array[];
}

/** Where a page keeps edits until they are safe on the server. What is kept here survives a reload. */
export interface EditStore {
  put(scope: EditScope, instance: string, edit: WaitingEdit): Promise<void>;
  /** Lets go of edits up to `clientSeq`: they are committed. */
  removeUpTo(scope: EditScope, instance: string, clientSeq: number): Promise<void>;
  /** Takes these edits out of waiting and keeps them as refused, in one step. */
  refuse(scope: EditScope, instance: string, clientSeqs: readonly number[], refused: RefusedEdit): Promise<void>;
  /**
   * Moves what copies that are no longer open left waiting to `instance`, numbered from 1 in the order it was made, and
   * gives it.
   */
  adopt(scope: EditScope, instance: string, isOpen: (instance: string) => boolean): Promise<WaitingEdit[]>;
  refused(scope: EditScope): Promise<RefusedEdit[]>;
  dropRefused(scope: EditScope, id: string): Promise<void>;
}
