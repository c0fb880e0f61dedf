import type { Command } from './command';
import { nudge, nudgeApplies } from './nudge';

export const nudgeUp: Command = {
  name: 'nudge-up', title: 'Nudge up', group: 'Parts', keys: ['ArrowUp'], edits: false,
  when: nudgeApplies,
  perform: (input) => nudge(input, 0, -1),
};
