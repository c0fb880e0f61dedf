import type { Command } from './command';
import { poseApplies, turned } from './pose';

export const turnLeft: Command = {
  name: 'turn-left', title: 'Turn left', group: 'Parts', keys: [','], edits: true,
  when: poseApplies,
  perform: (input) => turned(input, -1),
};
