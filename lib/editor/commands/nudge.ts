import { gridUnit } from '@/lib/document/records';
import { moveItems, shiftBy } from '../edits/move-items';
import type { CommandInput, Effect, Refused } from './command';

/** Arrow keys move what is chosen while selecting, and the cursor with any other tool. */
export const nudgeApplies = ({ state }: CommandInput): boolean => state.tool !== 'select' || state.selection.size > 0;

export function nudge({ state, newId }: CommandInput, x: number, y: number): Effect | Refused {
  const [dx, dy] = [x * gridUnit, y * gridUnit];
  if (state.tool !== 'select') {
    const cursor = { x: state.cursor.x + dx, y: state.cursor.y + dy };
    return { cursor, ...(state.ghost ? { ghost: { ...state.ghost, at: cursor } } : {}) };
  }
  if (state.readOnly) return { refused: 'This sheet is read-only for you.' };
  return { sheet: moveItems(state.sheet, state.selection, shiftBy(dx, dy), newId) };
}
