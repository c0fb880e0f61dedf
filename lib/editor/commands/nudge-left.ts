import type { Command } from './command';
import { nudge, nudgeApplies } from './nudge';

export const nudgeLeft: Command = {
  name: 'nudge-left', title: 'Nudge left', group: 'Parts', keys: ['ArrowLeft'], edits: false,
  when: nudgeApplies,
  perform: (input) => nudge(input, -1, 0),
};
