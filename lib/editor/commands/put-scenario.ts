import { putScenario as put } from '@/lib/document/plan/set-plan';
import type { ScenarioRecord } from '@/lib/document/records';
import { always, type Command } from './command';

/** Adds or changes a scenario; without an id it is a new one. */
export const putScenario: Command<Omit<ScenarioRecord, 'id'> & { readonly id?: string }> = {
  name: 'put-scenario', title: 'Change a scenario', group: 'Plan', keys: [], edits: true,
  when: always,
  perform: ({ state, newId }, { id, ...scenario }) => {
    const answer = put(state.sheet, { ...scenario, id: id ?? newId() });
    return answer.ok ? { sheet: answer.sheet } : { refused: answer.reason };
  },
};
