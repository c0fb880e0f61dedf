import type { Command } from './command';

/** Does at the cursor what a click does with the tool in hand: put a part down, start or bend a wire, name a net. */
export const press: Command = {
  name: 'press', title: 'Put down, bend or name at the cursor', group: 'Tools', keys: ['Enter'], edits: false,
  when: ({ state }) => state.tool !== 'select',
  perform: () => ({ press: true }),
};
