import type { Point } from '@/lib/document/geometry/point';
import type { Sheet } from '@/lib/document/records';
import type { ArgsOf, CommandName } from '../commands/command-list';
import type { NewId } from '../edits/edit';
import type { EditorState, Gesture, Ghost } from '../editor-state';
import type { Hit } from '../hit-test';

/** A pointer event in sheet units. */
export interface PointerPress {
  readonly at: Point;
  readonly shift?: boolean;
  readonly mod?: boolean;
  /** How far from a thing still counts as on it, in sheet units: larger for fingers and when zoomed out. */
  readonly reach?: number;
}

/** What a tool may do to the editor. */
export interface ToolHost {
  readonly state: EditorState;
  readonly newId: NewId;
  hit(press: PointerPress): Hit;
  run<Name extends CommandName>(name: Name, args: ArgsOf<Name>): void;
  /** Shows a sheet without writing it; null shows the true one again. */
  preview(sheet: Sheet | null): void;
  gesture(gesture: Gesture): void;
  select(ids: ReadonlySet<string>): void;
  /** Takes a part in hand; null goes back to selecting. */
  hold(ghost: Ghost | null): void;
  say(message: string | null): void;
}

/** A state machine over pointer events. It keeps what it needs between down and up; `cancel` forgets it. */
export interface Tool {
  down(press: PointerPress): void;
  move(press: PointerPress): void;
  up(press: PointerPress): void;
  /** A second press at once. */
  double(press: PointerPress): void;
  cancel(): void;
}
