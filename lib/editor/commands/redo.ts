import type { Command } from './command';

export const redo: Command = {
  name: 'redo', title: 'Redo', group: 'Edit', keys: ['Mod+Shift+Z', 'Mod+Y'], edits: true,
  when: ({ state }) => state.canRedo,
  perform: () => ({ history: 'redo' }),
};
