import { ulid } from 'ulid';
import type * as Y from 'yjs';
import { SheetReader } from '@/lib/document/sheet-reader';
import type { Repair } from '@/lib/document/repair/repair';
import type { Sheet } from '@/lib/document/records';
import { writeSheet } from '@/lib/document/write-sheet';
import { commands, type ArgsOf, type CommandName } from './commands/command-list';
import type { Command, CommandInput, Effect, Refused } from './commands/command';
import type { Clip } from './edits/clip';
import type { NewId } from './edits/edit';
import type { EditorState, Ghost, ToolName } from './editor-state';
import { History } from './history';
import { hitTest, type Hit } from './hit-test';
import { commandOf, type KeyPress } from './keys';
import { AddTool, LiftTool, NetNameTool, NoteTool } from './tools/mark-tools';
import { SelectTool } from './tools/select-tool';
import type { PointerPress, Tool, ToolHost } from './tools/tool';
import { WireTool } from './tools/wire-tool';

export interface EditorOptions {
  readonly doc: Y.Doc;
  readonly readOnly?: boolean;
  readonly newId?: NewId;
}

export type CameraMove = 'in' | 'out' | 'fit';

/** Reach of a pointer in sheet units when the caller does not say. */
const usualReach = 5;

/**
 * The editor of one sheet for one person: tools, commands, selection and history over the shared document. It knows
 * nothing of screens: pointer events come in sheet units, and what to show is `state`. It is idle until `connect`.
 */
export class Editor {
  private current: EditorState;
  private clip: Clip | null = null;
  private readonly reader: SheetReader;
  private readonly history: History;
  private readonly tools: Readonly<Record<ToolName, Tool>>;
  private readonly listeners = new Set<() => void>();
  private readonly cameraListeners = new Set<(move: CameraMove) => void>();
  private readonly doc: Y.Doc;
  private readonly newId: NewId;
  /** What the last reading had to leave out; empty for a sound document. */
  repairs: readonly Repair[] = [];

  constructor({ doc, readOnly = false, newId = ulid }: EditorOptions) {
    this.doc = doc;
    this.newId = newId;
    this.reader = new SheetReader(doc);
    const { sheet, repairs } = this.reader.read();
    this.repairs = repairs;
    this.history = new History(doc, this, () => this.current.selection, (ids) => this.update({ selection: ids }));
    this.current = {
      sheet, shown: sheet, selection: new Set(), tool: 'select', ghost: null, gesture: { doing: 'nothing' }, hover: null, cursor: { x: 0, y: 0 },
      lifted: new Set(), readOnly, keysOn: true, canUndo: false, canRedo: false, message: null,
    };
    const host = this.host();
    this.tools = {
      select: new SelectTool(host), wire: new WireTool(host), 'net-name': new NetNameTool(host), note: new NoteTool(host),
      lift: new LiftTool(host), add: new AddTool(host),
    };
  }

  /** Follows the document from now on, and reads what it missed. Returns how to stop. */
  connect(): () => void {
    this.doc.on('afterTransaction', this.follow);
    this.reader.forgetAll();
    this.read();
    return () => this.doc.off('afterTransaction', this.follow);
  }

  get state(): EditorState {
    return this.current;
  }

  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  /** Told of zoom commands; the view itself belongs to the screen. */
  onCamera(listener: (move: CameraMove) => void): () => void {
    this.cameraListeners.add(listener);
    return () => this.cameraListeners.delete(listener);
  }

  /** The clip to offer to the system's clipboard; null before anything was copied. */
  get clipboard(): Clip | null {
    return this.clip;
  }

  setReadOnly(readOnly: boolean): void {
    if (readOnly === this.current.readOnly) return;
    this.tool.cancel();
    this.update({ readOnly, ghost: null });
  }

  can(name: CommandName): boolean {
    const command = commands[name] as Command<unknown>;
    return !(command.edits && this.current.readOnly) && command.when(this.input());
  }

  /** Does a command. True when it was done; a refusal stands in `state.message`. */
  run<Name extends CommandName>(name: Name, ...args: ArgsOf<Name> extends void ? [] : [ArgsOf<Name>]): boolean {
    const command = commands[name] as Command<unknown>;
    if (command.edits && this.current.readOnly) return this.refuse('This sheet is read-only for you.');
    if (!command.when(this.input())) return false;
    const effect = command.perform(this.input(), args[0]);
    if ('refused' in effect) return this.refuse((effect as Refused).refused);
    this.apply(effect as Effect);
    return true;
  }

  /** A key while the sheet has the focus. True when it was a command's, so that the browser does nothing of its own with it. */
  key(press: KeyPress): boolean {
    const name = commandOf(press, this.current.keysOn);
    if (name === undefined || !commands[name].when(this.input())) return false;
    this.run(name as 'undo');
    return true;
  }

  pointerDown(press: PointerPress): void {
    this.update({ message: null, cursor: press.at });
    this.tool.down(press);
  }

  pointerMove(press: PointerPress): void {
    if (this.current.gesture.doing === 'nothing' || this.current.gesture.doing === 'asking') this.lookUnder(press);
    this.tool.move(press);
  }

  /** Notes what the pointer is over. Not during a drag: there it would only cost time. */
  private lookUnder(press: PointerPress): void {
    const hit = this.hit(press);
    const hover = hit.on === 'nothing' ? null : hit;
    if (hover === null ? this.current.hover !== null : JSON.stringify(hover) !== JSON.stringify(this.current.hover)) this.update({ hover });
  }

  pointerUp(press: PointerPress): void {
    this.tool.up(press);
  }

  doublePress(press: PointerPress): void {
    this.tool.double(press);
  }

  /** Ends the gesture in hand, as when the pointer is lost. */
  pointerLost(): void {
    this.tool.cancel();
  }

  /** Says something about what was tried on the sheet; it stands until the next command. */
  say(message: string): void {
    this.update({ message });
  }

  /** Forgets undo: the document was built anew after a refused edit. */
  forgetHistory(): void {
    this.history.clear();
    this.update({});
  }

  private get tool(): Tool {
    return this.tools[this.current.tool];
  }

  private input(): CommandInput {
    return { state: this.current, clip: this.clip, newId: this.newId };
  }

  private refuse(message: string): false {
    this.update({ message });
    return false;
  }

  private apply(effect: Effect): void {
    if (effect.cancel || (effect.tool && effect.tool !== this.current.tool)) this.tool.cancel();
    if (effect.clip) this.clip = effect.clip;
    if (effect.sheet && effect.sheet !== this.current.sheet) {
      const { sheet } = this.current;
      this.history.record(() => writeSheet(this.doc, sheet, effect.sheet as Sheet, this));
    }
    if (effect.history === 'undo') this.history.undo();
    if (effect.history === 'redo') this.history.redo();
    this.update({
      message: effect.message ?? null,
      ...(effect.sheet && this.current.gesture.doing === 'asking' ? { gesture: { doing: 'nothing' } as const } : {}),
      ...(effect.selection ? { selection: effect.selection } : {}),
      ...(effect.tool ? { tool: effect.tool } : {}),
      ...(effect.ghost !== undefined ? { ghost: effect.ghost } : {}),
      ...(effect.cursor ? { cursor: effect.cursor } : {}),
      ...(effect.lifted ? { lifted: effect.lifted } : {}),
      ...(effect.keysOn !== undefined ? { keysOn: effect.keysOn } : {}),
    });
    if (effect.cursor) this.tool.move({ at: effect.cursor });
    if (effect.press) {
      this.tool.down({ at: this.current.cursor });
      this.tool.up({ at: this.current.cursor });
    }
    if (effect.camera) for (const listener of this.cameraListeners) listener(effect.camera);
  }

  /** Reads again what a transaction touched, whoever made it. */
  private readonly follow = (transaction: Y.Transaction): void => {
    if (transaction.changed.size === 0) return;
    this.reader.forget(transaction);
    this.read();
  };

  private read(): void {
    const { sheet, repairs } = this.reader.read();
    this.repairs = repairs;
    this.update({ sheet, shown: sheet });
  }

  private update(change: Partial<EditorState>): void {
    const next = { ...this.current, ...change, canUndo: this.history.canUndo, canRedo: this.history.canRedo };
    this.current = change.sheet || change.selection ? { ...next, selection: thereStill(next.sheet, next.selection) } : next;
    for (const listener of this.listeners) listener();
  }

  private hit(press: PointerPress): Hit {
    const { sheet, selection } = this.current;
    return hitTest(sheet, press.at, press.reach ?? usualReach, selection);
  }

  private host(): ToolHost {
    const now = () => this.current;
    return {
      get state() { return now(); },
      newId: this.newId,
      hit: (press) => this.hit(press),
      run: (name, args) => { (this.run as (name: CommandName, args: unknown) => boolean).call(this, name, args); },
      preview: (sheet) => this.update({ shown: sheet ?? this.current.sheet }),
      gesture: (gesture) => this.update({ gesture }),
      select: (ids) => this.update({ selection: ids }),
      hold: (ghost: Ghost | null) => this.update(ghost ? { ghost } : { ghost, tool: 'select' }),
      say: (message) => this.update({ message }),
    };
  }
}

function thereStill(sheet: Sheet, selection: ReadonlySet<string>): ReadonlySet<string> {
  if (selection.size === 0) return selection;
  const ids = new Set([...sheet.parts, ...sheet.wires, ...sheet.junctions].map((item) => item.id));
  return [...selection].every((id) => ids.has(id)) ? selection : new Set([...selection].filter((id) => ids.has(id)));
}
