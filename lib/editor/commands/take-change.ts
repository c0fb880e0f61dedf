import type { RemedyEdit } from '@/lib/netlist/findings/finding';
import { takeChange as applied } from '../remedy/take-change';
import { always, type Command } from './command';

/** Takes the change that a finding or a person proposes, as one edit. */
export const takeChange: Command<{ readonly edits: readonly RemedyEdit[] }> = {
  name: 'take-change', title: 'Take the proposed change', group: 'Edit', keys: [], edits: true,
  when: always,
  perform: ({ state, newId }, { edits }) => {
    const taken = applied(state.sheet, edits, newId);
    return 'refused' in taken ? taken : { sheet: taken.sheet, selection: new Set(taken.touched) };
  },
};
