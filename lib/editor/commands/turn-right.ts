import type { Command } from './command';
import { poseApplies, turned } from './pose';

export const turnRight: Command = {
  name: 'turn-right', title: 'Turn right', group: 'Parts', keys: ['.'], edits: true,
  when: poseApplies,
  perform: (input) => turned(input, 1),
};
