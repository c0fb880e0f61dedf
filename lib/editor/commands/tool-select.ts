import { always, type Command } from './command';

export const toolSelect: Command = {
  name: 'tool-select', title: 'Select', group: 'Tools', keys: ['1'], edits: false,
  when: always,
  perform: () => ({ tool: 'select', ghost: null, cancel: true }),
};
