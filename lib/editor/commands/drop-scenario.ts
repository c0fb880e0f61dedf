import { dropScenario as dropped } from '@/lib/document/plan/set-plan';
import { always, type Command } from './command';

/** Takes a scenario away; hold points that used it stay without one. */
export const dropScenario: Command<{ readonly id: string }> = {
  name: 'drop-scenario', title: 'Remove a scenario', group: 'Plan', keys: [], edits: true,
  when: always,
  perform: ({ state }, { id }) => ({ sheet: dropped(state.sheet, id) }),
};
