import { always, type Command } from './command';

export const toolWire: Command = {
  name: 'tool-wire', title: 'Draw a wire', group: 'Tools', keys: ['2'], edits: false,
  when: always,
  perform: () => ({ tool: 'wire', ghost: null, cancel: true }),
};
