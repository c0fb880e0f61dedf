import { setPlan as planned, type PlannedPoint } from '@/lib/document/plan/set-plan';
import { always, type Command } from './command';

/** Replaces the power-up plan, as one undoable edit. */
export const setPlan: Command<{ readonly points: readonly PlannedPoint[] }> = {
  name: 'set-plan', title: 'Change the plan', group: 'Plan', keys: [], edits: true,
  when: always,
  perform: ({ state, newId }, { points }) => {
    const answer = planned(state.sheet, points, newId);
    return answer.ok ? { sheet: answer.sheet } : { refused: answer.reason };
  },
};
