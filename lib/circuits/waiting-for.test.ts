import { expect, it } from 'vitest';
import { waitingFor, type TurnFacts } from './waiting-for';

const facts: TurnFacts = {
  state: 'in review', draft: false, openStops: 0, makers: ['ines', 'co'], reviewers: [], mentors: ['ruth', 'marek'], mustAnswer: 0, signedToTheEnd: false,
};
const turns = (more: Partial<TurnFacts>) => waitingFor({ ...facts, ...more }).map(({ person, why }) => `${person}: ${why}`);

it.each([
  [{}, ['ruth: review', 'marek: review']],
  [{ reviewers: ['tomasz'] }, ['tomasz: review']],
  [{ mustAnswer: 1 }, ['ines: a note must be answered']],
  [{ state: 'changes asked' }, ['ines: changes are asked for']],
  [{ state: null, openStops: null }, ['ines: cut a revision']],
  [{ state: null, openStops: 1 }, ['ines: answer 1 stop']],
  [{ state: 'cut' }, ['ines: ask for review']],
  [{ state: 'cut', openStops: 2 }, ['ines: answer 2 stops']],
  [{ state: 'signed off' }, ['ines: the next hold point']],
  [{ state: 'signed off', signedToTheEnd: true }, []],
  [{ state: 'signed off', signedToTheEnd: true, draft: true }, ['ines: cut a revision']],
] as const)('%o waits for %o', (more, expected) => {
  expect(turns(more)).toEqual(expected);
});
