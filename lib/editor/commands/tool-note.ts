import { always, type Command } from './command';

export const toolNote: Command = {
  name: 'tool-note', title: 'Write a note', group: 'Tools', keys: ['4'], edits: false,
  when: always,
  perform: () => ({ tool: 'note', ghost: null, cancel: true }),
};
