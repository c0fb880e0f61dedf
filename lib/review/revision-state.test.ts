import { expect, it } from 'vitest';
import { revisionState, type StateFacts } from './revision-state';

const facts: StateFacts = { asked: false, newerAsked: false, standingSignOffs: 0, withdrawnSignOffs: 0, objected: false };

it.each([
  ['cut', {}],
  ['cut', { objected: true }],
  ['in review', { asked: true }],
  ['changes asked', { asked: true, objected: true }],
  ['superseded', { asked: true, newerAsked: true, objected: true }],
  ['signed off', { asked: true, newerAsked: true, standingSignOffs: 1, withdrawnSignOffs: 1 }],
  ['withdrawn', { asked: true, withdrawnSignOffs: 1 }],
  ['withdrawn', { asked: true, newerAsked: true, withdrawnSignOffs: 2 }],
] as const)('is %s for %o', (state, more) => {
  expect(revisionState({ ...facts, ...more })).toBe(state);
});
