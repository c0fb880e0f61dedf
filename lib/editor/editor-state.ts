import type { Box, Point } from '@/lib/document/geometry/point';
import type { Turn } from '@/lib/document/geometry/turn';
import type { PartRecord, Sheet } from '@/lib/document/records';
import type { Hit } from './hit-test';

/** Tools in the order of the strip; `add` is reached by the drawer and by its key. */
export const toolNames = ['select', 'wire', 'net-name', 'note', 'lift', 'add'] as const;
export type ToolName = (typeof toolNames)[number];

/** A part on its way to the sheet, following pointer or cursor. */
export interface Ghost {
  readonly kind: PartRecord['kind'];
  readonly at: Point;
  readonly turn: Turn;
  readonly mirror: boolean;
}

/** What is going on between pointer down and up, for the screen to show. */
export type Gesture =
  | { readonly doing: 'nothing' }
  | { readonly doing: 'box'; readonly box: Box }
  | { readonly doing: 'moving' }
  | { readonly doing: 'wiring'; readonly path: readonly Point[]; readonly from: string; readonly joins: string | null; readonly at: Point }
  /** A net name or note waits for its words at a place. */
  | { readonly doing: 'asking'; readonly what: 'net-name' | 'note'; readonly at: Point };

/** Everything the screen shows of the editor. A new object with every change; parts that stay the same are the same objects. */
export interface EditorState {
  readonly sheet: Sheet;
  /** The sheet as a drag in progress would leave it; the sheet itself otherwise. */
  readonly shown: Sheet;
  readonly selection: ReadonlySet<string>;
  readonly tool: ToolName;
  readonly ghost: Ghost | null;
  readonly gesture: Gesture;
  readonly hover: Hit | null;
  /** Where keys point when no pointer does. */
  readonly cursor: Point;
  /** Designators of leads and plugs shown lifted: a way of looking, not an edit. */
  readonly lifted: ReadonlySet<string>;
  readonly readOnly: boolean;
  readonly keysOn: boolean;
  readonly canUndo: boolean;
  readonly canRedo: boolean;
  /** Last refusal or notice, for the status strip. */
  readonly message: string | null;
}
