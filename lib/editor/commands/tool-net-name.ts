import { always, type Command } from './command';

export const toolNetName: Command = {
  name: 'tool-net-name', title: 'Name a net', group: 'Tools', keys: ['3'], edits: false,
  when: always,
  perform: () => ({ tool: 'net-name', ghost: null, cancel: true }),
};
