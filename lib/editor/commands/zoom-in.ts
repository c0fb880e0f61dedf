import { always, type Command } from './command';

export const zoomIn: Command = {
  name: 'zoom-in', title: 'Zoom in', group: 'View', keys: ['PageUp'], edits: false,
  when: always,
  perform: () => ({ camera: 'in' }),
};
