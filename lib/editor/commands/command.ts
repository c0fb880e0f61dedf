import type { Sheet } from '@/lib/document/records';
import type { Clip } from '../edits/clip';
import type { NewId } from '../edits/edit';
import type { EditorState, Ghost, ToolName } from '../editor-state';

/** Headings under which commands stand in the command list. */
export type CommandGroup = 'Tools' | 'Parts' | 'Wires and nets' | 'Edit' | 'View' | 'Plan';

/** What a command reads. */
export interface CommandInput {
  readonly state: EditorState;
  readonly clip: Clip | null;
  readonly newId: NewId;
}

/** What a command does: any of a changed sheet, selection, tool and so on. Nothing is done by the command itself. */
export interface Effect {
  readonly sheet?: Sheet;
  readonly selection?: ReadonlySet<string>;
  readonly clip?: Clip;
  readonly tool?: ToolName;
  readonly ghost?: Ghost | null;
  readonly cursor?: { readonly x: number; readonly y: number };
  readonly lifted?: ReadonlySet<string>;
  readonly keysOn?: boolean;
  readonly history?: 'undo' | 'redo';
  readonly camera?: 'in' | 'out' | 'fit';
  /** Ends the gesture in progress. */
  readonly cancel?: boolean;
  /** Presses the tool at the cursor, as a click would. */
  readonly press?: boolean;
  readonly message?: string;
}

/** Why a command did not do it, in words for the person. Nothing has changed. */
export interface Refused {
  readonly refused: string;
}

/** A user command: its name, its keys, when it applies and what it does. Menu, keyboard, forms and tests share it. */
export interface Command<Args = void> {
  readonly name: string;
  readonly title: string;
  readonly group: CommandGroup;
  /** Keys as `Mod+Shift+Z`, `Delete`, `,`; `Mod` is Ctrl, or Cmd on a Mac. Never a bare letter. */
  readonly keys: readonly string[];
  /** Whether it changes the sheet: such commands are refused while the sheet is read-only. */
  readonly edits: boolean;
  when(input: CommandInput): boolean;
  perform(input: CommandInput, args: Args): Effect | Refused;
}

export const always = (): boolean => true;

export const hasSelection = ({ state }: CommandInput): boolean => state.selection.size > 0;
