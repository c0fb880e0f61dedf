import type { EditScope, EditStore, RefusedEdit, WaitingEdit } from './edit-store';

const keyOf = ({ personId, circuitId }: EditScope) => `${personId} ${circuitId}`;

/** Edits kept in memory: for pages whose browser refuses to store anything. They do not survive a reload. */
export class MemoryEdits implements EditStore {
  private readonly waiting = new Map<string, Map<string, WaitingEdit[]>>();
  private readonly refusals = new Map<string, RefusedEdit[]>();

  async put(scope: EditScope, instance: string, edit: WaitingEdit): Promise<void> {
    const copies = this.copies(scope);
    copies.set(instance, [...(copies.get(instance) ?? []), edit]);
  }

  async removeUpTo(scope: EditScope, instance: string, clientSeq: number): Promise<void> {
    this.keep(scope, instance, (edit) => edit.clientSeq > clientSeq);
  }

  async refuse(scope: EditScope, instance: string, clientSeqs: readonly number[], refused: RefusedEdit): Promise<void> {
    this.keep(scope, instance, (edit) => !clientSeqs.includes(edit.clientSeq));
    this.refusals.set(keyOf(scope), [...(await this.refused(scope)), refused]);
  }

  async adopt(scope: EditScope, instance: string, isOpen: (instance: string) => boolean): Promise<WaitingEdit[]> {
    const copies = this.copies(scope);
    const left = [...copies.keys()].filter((other) => other === instance || !isOpen(other));
    const edits = left.flatMap((other) => copies.get(other) ?? []).sort((a, b) => a.at - b.at || a.clientSeq - b.clientSeq)
      .map((edit, index) => ({ ...edit, clientSeq: index + 1 }));
    for (const other of left) copies.delete(other);
    copies.set(instance, edits);
    return edits;
  }

  async refused(scope: EditScope): Promise<RefusedEdit[]> {
    return this.refusals.get(keyOf(scope)) ?? [];
  }

  async dropRefused(scope: EditScope, id: string): Promise<void> {
    this.refusals.set(keyOf(scope), (await this.refused(scope)).filter((edit) => edit.id !== id));
  }

  private copies(scope: EditScope): Map<string, WaitingEdit[]> {
    const known = this.waiting.get(keyOf(scope)) ?? new Map<string, WaitingEdit[]>();
    this.waiting.set(keyOf(scope), known);
    return known;
  }

  private keep(scope: EditScope, instance: string, wanted: (edit: WaitingEdit) => boolean): void {
    const copies = this.copies(scope);
    copies.set(instance, (copies.get(instance) ?? []).filter(wanted));
  }
}
