import { moveItems } from '../edits/move-items';
import { mirrorAbout, pivotOf } from '../edits/turn-items';
import type { Command } from './command';
import { poseApplies } from './pose';

export const mirror: Command = {
  name: 'mirror', title: 'Mirror', group: 'Parts', keys: ['-'], edits: true,
  when: poseApplies,
  perform: ({ state, newId }) => {
    if (state.ghost) return { ghost: { ...state.ghost, mirror: !state.ghost.mirror } };
    return { sheet: moveItems(state.sheet, state.selection, mirrorAbout(pivotOf(state.sheet, state.selection)), newId) };
  },
};
