import { always, type Command } from './command';

/** Ends what is going on: a wire keeps what has been laid, a part being placed goes back, then the selection is dropped. */
export const cancel: Command = {
  name: 'cancel', title: 'End, or drop the selection', group: 'Edit', keys: ['Escape'], edits: false,
  when: always,
  perform: ({ state }) => {
    if (state.gesture.doing !== 'nothing') return { cancel: true };
    if (state.ghost) return { ghost: null, tool: 'select' };
    if (state.tool !== 'select') return { tool: 'select' };
    return { selection: new Set() };
  },
};
