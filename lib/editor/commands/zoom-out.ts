import { always, type Command } from './command';

export const zoomOut: Command = {
  name: 'zoom-out', title: 'Zoom out', group: 'View', keys: ['PageDown'], edits: false,
  when: always,
  perform: () => ({ camera: 'out' }),
};
