import { markOpen as marked } from '../edits/mark-open';
import { always, type Command } from './command';

/** Marks a pin as left open on purpose, or takes the mark away. */
export const markOpen: Command<{ readonly part: string; readonly pin: string; readonly open: boolean }> = {
  name: 'mark-open', title: 'Left open', group: 'Wires and nets', keys: [], edits: true,
  when: always,
  perform: ({ state }, { part, pin, open }) => ({ sheet: marked(state.sheet, part, pin, open) }),
};
