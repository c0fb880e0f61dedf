import { always, type Command } from './command';

/** Goes to the drawer's search; the part chosen there is handed to `hold-part`. */
export const toolAdd: Command = {
  name: 'tool-add', title: 'Add a part', group: 'Tools', keys: ['0'], edits: false,
  when: always,
  perform: () => ({ tool: 'add', cancel: true }),
};
