import type * as Y from 'yjs';
import { joinsOf } from '@/lib/document/nets/joins';
import type { PartRecord, Sheet } from '@/lib/document/records';
import { SheetReader } from '@/lib/document/sheet-reader';

const drawn = new WeakMap<PartRecord, string>();

/** A part without where and how it is drawn. */
function partText(part: PartRecord): string {
  let text = drawn.get(part);
  if (text === undefined) {
    const { x: _x, y: _y, turn: _turn, mirror: _mirror, ...rest } = part;
    text = JSON.stringify(rest);
    drawn.set(part, text);
  }
  return text;
}

/** All that the content hash is worked out from: sheets equal in this have the same one. Far cheaper than the hash itself. */
function inputsOf(sheet: Sheet): string {
  return [
    ...sheet.parts.map(partText), JSON.stringify([joinsOf(sheet), sheet.scenarios, sheet.holdPoints, sheet.models, sheet.subcircuits]),
  ].join('\n');
}

/** Says after each change of a document whether the content hash changed with it. */
export class ElectricalWatch {
  private readonly reader: SheetReader;
  private inputs: string;
  private hash: string;

  constructor(private readonly doc: Y.Doc, private readonly contentHash: (doc: Y.Doc) => string) {
    this.reader = new SheetReader(doc);
    doc.on('afterTransaction', (transaction: Y.Transaction) => this.reader.forget(transaction));
    this.inputs = inputsOf(this.reader.read().sheet);
    this.hash = contentHash(doc);
  }

  /** True when the sheet's content hash is another one than at the last call. */
  changed(): boolean {
    const inputs = inputsOf(this.reader.read().sheet);
    if (inputs === this.inputs) return false;
    const hash = this.contentHash(this.doc);
    const changed = hash !== this.hash;
    this.inputs = inputs;
    this.hash = hash;
    return changed;
  }
}
