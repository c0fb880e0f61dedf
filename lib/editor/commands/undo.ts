import type { Command } from './command';

export const undo: Command = {
  name: 'undo', title: 'Undo', group: 'Edit', keys: ['Mod+Z'], edits: true,
  when: ({ state }) => state.canUndo,
  perform: () => ({ history: 'undo' }),
};
