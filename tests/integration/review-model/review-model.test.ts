import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { circuitGate } from '@/lib/access/gates';
import { memberships } from '@/db/schema/people';
import { eq } from 'drizzle-orm';
import { replaceChecker } from '@/lib/review/check-copy';
import { readReviewPicture, stateOf as stateFrom } from '@/lib/review/review-view';
import { ApiWorld, type TestBench, type TestPerson } from '../../support/api-world';
import { callerOf, postAs } from '../../support/bench-with-circuit';
import { checkedWith, findingOf } from '../../support/findings';
import { choose } from './choose';
import { errorOf, stateOf, step, stopFromOf, type Action, type Model } from './model';
import { perform, type Stage } from './perform';
import { Random } from './random';

/** 20,000 steps here; `npm run soak` asks for a million. */
const steps = Number(process.env['REVIEW_MODEL_STEPS'] ?? 20_000);
const firstSeed = Number(process.env['REVIEW_MODEL_SEED'] ?? 1);
const chains = 4;
/** A circuit is reviewed for this many steps, then another one begins. */
const stepsEach = 200;
const startRoles = ['member', 'member', 'mentor', 'mentor', 'steward'] as const;

let world: ApiWorld;

beforeAll(async () => {
  world = await ApiWorld.start();
  replaceChecker(async ({ parts }) => {
    const value = Number(parts.find(({ ref }) => ref === 'R1')?.facts.value ?? 0);
    const from = stopFromOf(value);
    return checkedWith([
      ...(from === null ? [] : [findingOf({ holdPoint: `${from} V`, fromVolts: from })]),
      ...(errorOf(value) ? [findingOf({ rule: 'broken', outcome: 'error', refs: [] })] : []),
    ]);
  });
});
afterAll(() => world.stop());

interface Chain { readonly bench: TestBench; readonly people: readonly TestPerson[] }

async function chainOf(): Promise<Chain> {
  const people = await Promise.all(['Maker', 'Member', 'Mentor', 'Second mentor', 'Steward'].map((name) => world.person(name)));
  const bench = await world.bench(people[4] as TestPerson, people.slice(0, 4).map((person, index) => [person, startRoles[index] ?? 'member'] as const));
  return { bench, people };
}

async function begin({ bench, people }: Chain): Promise<{ stage: Stage; model: Model }> {
  for (const [index, { id }] of people.entries()) {
    await world.db.update(memberships).set({ role: startRoles[index] ?? 'member' }).where(eq(memberships.personId, id));
  }
  const poster = people[0] as TestPerson;
  const circuit = await postAs(world, bench, poster);
  const stage: Stage = {
    world, bench: bench.id, circuit, people: new Map(people.map((person) => [person.id, person])),
    made: { revisions: [], hashes: [], signOffs: [], objections: [], threads: [] },
  };
  const model: Model = {
    roles: Object.fromEntries(people.map(({ id }, index) => [id, startRoles[index] ?? 'member'])), poster: poster.id,
    makers: [poster.id], everMakers: [poster.id], editors: [poster.id], seq: 1, value: 1_000, revisions: [], signOffs: [], objections: [], threads: [],
  };
  return { stage, model };
}

/** Two sign-offs, a sign-off against an objection, against a newer review, against the loss of the right: at once. */
function rival(random: Random, model: Model, people: readonly string[], action: Action): Action | undefined {
  if (action.act !== 'sign' && action.act !== 'withdraw') return undefined;
  const who = random.pick(people.filter((person) => person !== action.who));
  if (action.act === 'withdraw') return { ...action, who, reason: true };
  return random.pick<Action>([
    { ...action, who }, { act: 'object', who, revision: action.revision }, { act: 'note', who, must: true },
    { act: 'role', who: action.who === model.poster ? who : action.who, role: 'member' },
  ]);
}

async function compare(stage: Stage, model: Model, context: string): Promise<void> {
  const access = await circuitGate(world.db, callerOf([...stage.people.values()][0] as TestPerson), stage.circuit);
  const picture = await readReviewPicture(world.db, [access.circuit]);
  const found = [...picture.revisions].reverse().map((revision) => stateFrom(picture, revision));
  expect(found, context).toEqual(model.revisions.map((_, index) => stateOf(model, index)));
  expect(picture.signOffs.map(({ contentHash, revisionId }) => contentHash === picture.revisions.find(({ id }) => id === revisionId)?.contentHash), context)
    .toEqual(model.signOffs.map(() => true));
}

async function runChain(seed: number, count: number): Promise<{ readonly signed: number; readonly raced: number }> {
  const random = new Random(seed);
  const chain = await chainOf();
  const ids = chain.people.map(({ id }) => id);
  let signed = 0;
  let raced = 0;
  for (let done = 0; done < count;) {
    const begun = await begin(chain);
    const { stage } = begun;
    let { model } = begun;
    for (let round = 0; round < stepsEach && done < count; round += 1, done += 1) {
      const action = choose(random, model, ids);
      const other = random.chance(0.15) ? rival(random, model, ids, action) : undefined;
      const context = `seed ${seed}, step ${done}: ${JSON.stringify(action)}${other ? ` beside ${JSON.stringify(other)}` : ''}`;
      if (!other) {
        const expected = step(model, action);
        expect(await perform(stage, action), context).toBe(expected);
        if (action.act === 'sign' && expected === 'ok') signed += 1;
      } else {
        // Whatever happens at once must be one of the two orders.
        const orders = [[action, other], [other, action]] as const;
        const outcomes = orders.map((order) => {
          const copy = structuredClone(model);
          const answers = order.map((each) => step(copy, each));
          return { copy, answers: order[0] === action ? answers : [answers[1], answers[0]] };
        });
        const answers = await Promise.all([perform(stage, action), perform(stage, other)]);
        const fits = outcomes.find((outcome) => outcome.answers[0] === answers[0] && outcome.answers[1] === answers[1]);
        expect(fits, `${context} answered ${answers.join(' and ')}, not ${outcomes.map((outcome) => outcome.answers.join(' and ')).join(' or ')}`).toBeDefined();
        model = fits?.copy ?? model;
        raced += 1;
      }
      if (round % 50 === 49) await compare(stage, model, context);
    }
  }
  return { signed, raced };
}

describe('the review, as a model', () => {
  it(`answers as the rules say for ${steps} random acts of five roles, races included`, async () => {
    const results = await Promise.all(Array.from({ length: chains }, (_, index) => runChain(firstSeed + index, Math.ceil(steps / chains))));
    const sum = (of: (result: { signed: number; raced: number }) => number) => results.reduce((total, result) => total + of(result), 0);
    // A run in which nothing was ever signed would prove nothing.
    expect(sum(({ signed }) => signed)).toBeGreaterThan(steps / 1_000);
    expect(sum(({ raced }) => raced)).toBeGreaterThan(steps / 100);
  }, Math.max(20 * 60_000, steps * 60));
});
