import { turnedBy } from '@/lib/document/geometry/turn';
import { moveItems } from '../edits/move-items';
import { pivotOf, turnAbout } from '../edits/turn-items';
import type { CommandInput, Effect } from './command';

export const poseApplies = ({ state }: CommandInput): boolean => state.ghost !== null || state.selection.size > 0;

/** Turns the part being placed, else what is chosen, by a quarter. */
export function turned({ state, newId }: CommandInput, quarters: 1 | -1): Effect {
  if (state.ghost) return { ghost: { ...state.ghost, turn: turnedBy(state.ghost.turn, quarters) } };
  return { sheet: moveItems(state.sheet, state.selection, turnAbout(pivotOf(state.sheet, state.selection), quarters), newId) };
}
