import { always, type Command } from './command';

export const selectAll: Command = {
  name: 'select-all', title: 'Select all', group: 'Edit', keys: ['Mod+A'], edits: false,
  when: always,
  perform: ({ state: { sheet } }) => ({ tool: 'select', selection: new Set([...sheet.parts, ...sheet.wires, ...sheet.junctions].map((item) => item.id)) }),
};
