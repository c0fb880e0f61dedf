import * as Y from 'yjs';
import { partAt } from '@/lib/document/testing/sheet-builder';
import { readSheet } from '@/lib/document/read-sheet';
import { writeSheet } from '@/lib/document/write-sheet';
import type { PartRecord } from '@/lib/document/records';

/** A document that edits are made on, for tests. Each edit gives the Yjs update that a page would send. */
export class SheetCopy {
  readonly doc = new Y.Doc();
  private updates: Uint8Array[] = [];

  constructor(start: Uint8Array = Uint8Array.of(0, 0)) {
    Y.applyUpdate(this.doc, start, 'remote');
    this.doc.on('update', (update: Uint8Array, origin: unknown) => {
      if (origin !== 'remote') this.updates.push(update);
    });
  }

  get clientId(): number {
    return this.doc.clientID;
  }

  receive(update: Uint8Array): void {
    Y.applyUpdate(this.doc, update, 'remote');
  }

  /** Adds a resistor and gives the update. */
  addResistor(ref: string, ohms = 22_000): Uint8Array {
    const { sheet } = readSheet(this.doc);
    const place = 20 * sheet.parts.length;
    return this.edit({ parts: [...sheet.parts, partAt('resistor', ref, place, place, { facts: { value: ohms } })] });
  }

  move(ref: string, x: number): Uint8Array {
    return this.edit({ parts: this.parts().map((part) => (part.ref === ref ? { ...part, x } : part)) });
  }

  remove(ref: string): Uint8Array {
    return this.edit({ parts: this.parts().filter((part) => part.ref !== ref) });
  }

  parts(): readonly PartRecord[] {
    return readSheet(this.doc).sheet.parts;
  }

  refs(): string[] {
    return this.parts().map((part) => part.ref).sort();
  }

  private edit(change: { parts: readonly PartRecord[] }): Uint8Array {
    const { sheet } = readSheet(this.doc);
    this.updates = [];
    writeSheet(this.doc, sheet, { ...sheet, ...change });
    return Y.mergeUpdates(this.updates);
  }
}
