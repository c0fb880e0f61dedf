import { always, type Command } from './command';

export const zoomFit: Command = {
  name: 'zoom-fit', title: 'Show the whole sheet', group: 'View', keys: ['Mod+0'], edits: false,
  when: always,
  perform: () => ({ camera: 'fit' }),
};
