import { always, type Command } from './command';

export const zoomFit: Command = {
  name: 'zoom-fit', title: 'Show the whole sheet', group: 'View', keys: ['Home'], edits: false,
  when: always,
  perform: () => ({ camera: 'fit' }),
};
