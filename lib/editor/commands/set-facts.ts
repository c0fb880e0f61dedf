import type { PartRecord } from '@/lib/document/records';
import { refusedFact, setFacts as applied, type FactChanges } from '../edits/set-facts';
import { always, type Command } from './command';

/** Sets facts of a part, in SI units; null takes one away. Refused with the reason when a value is out of bounds. */
export const setFacts: Command<{ readonly part: string; readonly facts: FactChanges; readonly origin?: PartRecord['origins'][string] }> = {
  name: 'set-facts', title: 'Set values', group: 'Parts', keys: [], edits: true,
  when: always,
  perform: ({ state }, { part, facts, origin = 'typed' }) => {
    if (!state.sheet.parts.some((one) => one.id === part)) return { refused: 'That part is no longer on the sheet.' };
    const refused = Object.entries(facts).map(([key, value]) => refusedFact(key, value)).find((words) => words !== null);
    return refused ? { refused } : { sheet: applied(state.sheet, part, facts, origin) };
  },
};
