import type { Command } from './command';
import { nudge, nudgeApplies } from './nudge';

export const nudgeDown: Command = {
  name: 'nudge-down', title: 'Nudge down', group: 'Parts', keys: ['ArrowDown'], edits: false,
  when: nudgeApplies,
  perform: (input) => nudge(input, 0, 1),
};
