import { snap } from '@/lib/document/geometry/point';
import { attachPins } from '../edits/attach-pins';
import { moveItems, shiftBy } from '../edits/move-items';
import { hasSelection, type Command } from './command';

/** Moves what is chosen by a distance in sheet units, and joins pins to wires they were dropped on. */
export const move: Command<{ readonly dx: number; readonly dy: number }> = {
  name: 'move', title: 'Move', group: 'Parts', keys: [], edits: true,
  when: hasSelection,
  perform: ({ state, newId }, { dx, dy }) => {
    const moved = moveItems(state.sheet, state.selection, shiftBy(snap(dx), snap(dy)), newId);
    return { sheet: attachPins(moved, state.selection, newId) };
  },
};
