import type { Command } from './command';
import { nudge, nudgeApplies } from './nudge';

export const nudgeRight: Command = {
  name: 'nudge-right', title: 'Nudge right', group: 'Parts', keys: ['ArrowRight'], edits: false,
  when: nudgeApplies,
  perform: (input) => nudge(input, 1, 0),
};
