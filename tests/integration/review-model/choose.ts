import { plan, type Action, type Model } from './model';
import type { Random } from './random';

/** Weights: what moves a review on is tried often, what starts it over seldom. */
const weights: readonly (readonly [Action['act'], number])[] = [
  ['edit', 4], ['cut', 5], ['ask', 10], ['sign', 34], ['withdraw', 5], ['object', 4], ['lift', 18], ['note', 3], ['resolve', 15], ['makers', 0.4], ['role', 1.6],
];
const total = weights.reduce((sum, [, weight]) => sum + weight, 0);

function chooseAct(random: Random): Action['act'] {
  let at = random.next() * total;
  for (const [act, weight] of weights) {
    at -= weight;
    if (at < 0) return act;
  }
  return 'sign';
}

/** Index into a list, the newest ones far more often. */
const recent = (random: Random, length: number): number => (random.chance(0.7) ? length - 1 : random.below(length));

const mentorOf = (random: Random, model: Model, people: readonly string[]): string | undefined => random.pick(people.filter((person) => model.roles[person] === 'mentor'));

/** A random action that names things which are there; who may not do it is tried as well. */
export function choose(random: Random, model: Model, people: readonly string[]): Action {
  const who = random.pick(people);
  const act = chooseAct(random);
  const { revisions, signOffs, objections, threads } = model;
  if (act === 'ask' && revisions.length > 0) return { act, who: random.chance(0.7) ? model.poster : who, revision: recent(random, revisions.length), reviewers: people.filter(() => random.chance(0.2)) };
  if (act === 'sign' && revisions.length > 0) return { act, who: random.chance(0.6) ? mentorOf(random, model, people) ?? who : who, revision: recent(random, revisions.length), point: random.below(plan.length), foreignHash: random.chance(0.1) };
  if (act === 'withdraw' && signOffs.length > 0) return { act, who, signOff: recent(random, signOffs.length), reason: random.chance(0.7) };
  if (act === 'object' && revisions.length > 0) return { act, who, revision: recent(random, revisions.length) };
  if (act === 'lift' && objections.length > 0) return { act, who, objection: random.below(objections.length), reason: random.chance(0.8) };
  if (act === 'resolve' && threads.length > 0) return { act, who, thread: random.below(threads.length) };
  if (act === 'note') return { act, who, must: random.chance(0.4) };
  if (act === 'makers') return { act, who: random.chance(0.5) ? model.poster : who, makers: people.filter(() => random.chance(0.12)) };
  if (act === 'role') return { act, who: random.pick(people.filter((person) => person !== model.poster)), role: random.pick(['member', 'mentor', 'mentor', 'steward']) };
  if (act === 'cut') return { act, who: random.chance(0.7) ? model.poster : who };
  return { act: 'edit', who: random.chance(0.7) ? model.poster : who, value: 1_000 + random.below(1_000_000) };
}
