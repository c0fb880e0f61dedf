import { always, type Command } from './command';

/** Chooses things by id: from the margin, the tables, or by focus. */
export const selectItems: Command<{ readonly ids: readonly string[] }> = {
  name: 'select-items', title: 'Select', group: 'Edit', keys: [], edits: false,
  when: always,
  perform: (_, { ids }) => ({ selection: new Set(ids) }),
};
