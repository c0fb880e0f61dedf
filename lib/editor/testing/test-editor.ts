import * as Y from 'yjs';
import { pinPlaceOf } from '@/lib/document/geometry/pin-place';
import { snapPoint, type Point } from '@/lib/document/geometry/point';
import { contentHashOf, presentationHash, sheetToNetlist } from '@/lib/document/nets/sheet-to-netlist';
import { readSheet } from '@/lib/document/read-sheet';
import { sharedTypesOf } from '@/lib/document/stored-sheet';
import type { PartRecord, Sheet } from '@/lib/document/records';
import { emptySheet, writeSheet } from '@/lib/document/write-sheet';
import type { KindId } from '@/lib/netlist/kinds/kind-id';
import type { ArgsOf, CommandName } from '../commands/command-list';
import { Editor } from '../editor';
import type { KeyPress } from '../keys';

/** Where a pointer goes: a pin (`Q1:G`), a part's origin (`Q1`) or a place. */
export type Place = string | Point;

/** Throws when two values differ as JSON. */
function same(what: string, got: unknown, wanted: unknown): void {
  const [a, b] = [JSON.stringify(got), JSON.stringify(wanted)];
  if (a !== b) throw new Error(`${what}: got ${a}, wanted ${b}`);
}

/** Drives an editor the way a person does, without a browser. */
export class TestEditor {
  readonly doc = new Y.Doc();
  readonly editor: Editor;

  constructor(sheet: Sheet = emptySheet, options: { readonly readOnly?: boolean; readonly doc?: Y.Doc; readonly idPrefix?: string } = {}) {
    if (options.doc) this.doc = options.doc;
    sharedTypesOf(this.doc);
    if (sheet !== emptySheet) writeSheet(this.doc, emptySheet, sheet, 'load');
    let count = 0;
    const prefix = options.idPrefix ?? 'n';
    this.editor = new Editor({ doc: this.doc, readOnly: options.readOnly ?? false, newId: () => `${prefix}${String((count += 1)).padStart(5, '0')}` });
    this.editor.connect();
  }

  get sheet(): Sheet {
    return this.editor.state.sheet;
  }

  part(ref: string): PartRecord {
    const part = this.sheet.parts.find((one) => one.ref === ref || one.id === ref);
    if (!part) throw new Error(`There is no ${ref}.`);
    return part;
  }

  at(place: Place): Point {
    if (typeof place !== 'string') return place;
    const [ref = '', pin] = place.split(':');
    const part = this.part(ref);
    const where = pin === undefined ? part : pinPlaceOf(part, pin);
    if (!where) throw new Error(`There is no ${place}.`);
    return { x: where.x, y: where.y };
  }

  pointerDown(place: Place, keys: { readonly shift?: boolean } = {}): this {
    this.editor.pointerDown({ at: this.at(place), ...keys });
    return this;
  }

  pointerMove(place: Place): this {
    this.editor.pointerMove({ at: this.at(place) });
    return this;
  }

  pointerUp(place: Place, keys: { readonly shift?: boolean } = {}): this {
    this.editor.pointerUp({ at: this.at(place), ...keys });
    return this;
  }

  click(place: Place, keys: { readonly shift?: boolean } = {}): this {
    return this.pointerMove(place).pointerDown(place, keys).pointerUp(place, keys);
  }

  /** Presses, moves in a few steps and lets go. */
  drag(from: Place, to: Place): this {
    const [a, b] = [this.at(from), this.at(to)];
    this.pointerDown(a);
    for (let step = 1; step <= 4; step += 1) this.pointerMove({ x: a.x + ((b.x - a.x) * step) / 4, y: a.y + ((b.y - a.y) * step) / 4 });
    return this.pointerUp(b);
  }

  /** Presses keys, `Mod+Z` or `Delete`, one after the other. */
  press(...shortcuts: readonly string[]): this {
    for (const shortcut of shortcuts) {
      const parts = shortcut.length === 1 ? [shortcut] : shortcut.split('+');
      const press: KeyPress = { key: parts.at(-1) || '+', mod: parts.includes('Mod'), shift: parts.includes('Shift') };
      this.editor.key(press);
    }
    return this;
  }

  run<Name extends CommandName>(name: Name, ...args: ArgsOf<Name> extends void ? [] : [ArgsOf<Name>]): this {
    this.editor.run(name, ...args);
    return this;
  }

  place(kind: KindId, x: number, y: number, turn: PartRecord['turn'] = 0): this {
    return this.run('place-part', { kind, at: { x, y }, turn });
  }

  /** Net of a pin, by name. */
  netOf(pin: string): string | undefined {
    const [ref, name = ''] = pin.split(':');
    return sheetToNetlist(this.sheet).parts.find((part) => part.ref === ref)?.pins[name];
  }

  /** Expects exactly these pins on the net of the first one. */
  expectNet(...pins: readonly string[]): this {
    const net = this.netOf(pins[0] ?? '');
    same(`Net of ${pins[0]}`, [...(sheetToNetlist(this.sheet).nets.find((one) => one.name === net)?.pins ?? [])].sort(), [...pins].sort());
    return this;
  }

  expectSelected(...refs: readonly string[]): this {
    const names = [...this.editor.state.selection].map((id) => this.sheet.parts.find((part) => part.id === id)?.ref ?? id);
    same('Selection', names.sort(), [...refs].sort());
    return this;
  }

  expectRefs(...refs: readonly string[]): this {
    same('Designators', this.sheet.parts.map((part) => part.ref).filter((ref) => ref !== '').sort(), [...refs].sort());
    return this;
  }

  /** What must hold after every command: a reader repairs nothing, no end dangles, everything stands on the grid. */
  expectSound(): this {
    const { sheet, repairs } = readSheet(this.doc);
    same('Repairs', repairs, []);
    same('Sheet as stored', sheet, this.sheet);
    for (const item of [...sheet.parts, ...sheet.junctions]) same('Place on the grid', snapPoint(item), { x: item.x, y: item.y });
    return this;
  }

  get hashes(): readonly [string, string] {
    return [contentHashOf(this.sheet), presentationHash(this.sheet)];
  }

  undoAll(): this {
    while (this.editor.state.canUndo) this.press('Mod+Z');
    return this;
  }
}
