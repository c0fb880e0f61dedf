import { always, type Command } from './command';

export const toolLift: Command = {
  name: 'tool-lift', title: 'Lift a lead', group: 'Tools', keys: ['5'], edits: false,
  when: always,
  perform: () => ({ tool: 'lift', ghost: null, cancel: true }),
};
