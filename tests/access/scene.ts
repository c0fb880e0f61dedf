import type { CircuitAccess } from '@/lib/access/gates';
import { circuitGate, revisionGate } from '@/lib/access/gates';
import { hashPassword } from '@/lib/auth/password';
import { newToken, tokenHash } from '@/lib/auth/token';
import { setMakers } from '@/lib/circuits/name-makers';
import { askForChanges } from '@/lib/review/ask-for-changes';
import { askForReview } from '@/lib/review/ask-for-review';
import type { Act } from '@/lib/review/act';
import { cutRevision } from '@/lib/review/cut-revision';
import { revisionView } from '@/lib/review/read-revision';
import { signOff } from '@/lib/review/sign-off';
import { listThreadViews } from '@/lib/review/thread-view';
import { openNote } from '@/lib/review/write-note';
import { insertGuestLink } from '@/db/mutations/guest-links';
import { insertPerson } from '@/db/mutations/benches';
import { inTransaction } from '@/db/transaction';
import { ulid } from 'ulid';
import type { ApiWorld, TestBench, TestPerson } from '../support/api-world';
import { callerOf, personOf, postAs } from '../support/bench-with-circuit';
import { callers, type CallerName } from './matrix';

/** The people of the matrix, once for all scenes. */
export interface Cast {
  readonly bench: TestBench;
  readonly people: Readonly<Record<Exclude<CallerName, 'nobody' | 'guest'>, TestPerson>>;
  /** An account with a password, for signing in. */
  readonly account: { readonly email: string; readonly password: string };
}

export async function castOf(world: ApiWorld): Promise<Cast> {
  const names = callers.filter((name) => name !== 'nobody' && name !== 'guest');
  const people = Object.fromEntries(await Promise.all(names.map(async (name) => [name, await world.person(`Person ${name}`)]))) as unknown as Cast['people'];
  await world.bench(people.stranger);
  const bench = await world.bench(people.steward, [
    [people.member, 'member'], [people.reviewer, 'member'], [people.maker, 'member'], [people.coMaker, 'member'],
    [people.mentor, 'mentor'], [people.pastMaker, 'mentor'],
  ]);
  const account = { email: `${ulid().toLowerCase()}@northgate.test`, password: 'words and letters 7' };
  await inTransaction(world.db, async (tx) => insertPerson(tx, { id: ulid(), email: account.email, name: 'Account', passwordHash: await hashPassword(account.password) }));
  return { bench, people, account };
}

/** One circuit with everything a call may name, made through the use cases. */
export interface Scene {
  readonly bench: string;
  readonly circuit: string;
  readonly revision: string;
  readonly contentHash: string;
  readonly seq: number;
  /** The mentor's, standing. Null where the scene has an objection instead. */
  readonly signOff: string | null;
  readonly objection: string | null;
  readonly thread: string;
  readonly mustAnswer: string | null;
  readonly message: string;
  readonly guestCookie: string;
}

export type SceneWith = 'nothing' | 'sign-off' | 'objection' | 'must-answer' | 'cut only';

export async function sceneOf(world: ApiWorld, { bench, people }: Cast, holding: SceneWith): Promise<Scene> {
  const act = (person: TestPerson): Act => ({ db: world.db, person: personOf(person), requestId: 'scene', now: new Date() });
  const at = (person: TestPerson): Promise<CircuitAccess> => circuitGate(world.db, callerOf(person), circuit);
  const circuit = await postAs(world, bench, people.maker);
  await setMakers(act(people.maker), await at(people.maker), [people.coMaker.id, people.pastMaker.id]);
  await setMakers(act(people.maker), await at(people.maker), [people.coMaker.id]);

  const revision = (await cutRevision(act(people.maker), await at(people.maker), { note: '' })).value;
  const reviewAs = (person: TestPerson) => revisionGate(world.db, callerOf(person), revision);
  const view = await revisionView(world.db, await at(people.maker), revision);
  if (holding !== 'cut only') await askForReview(act(people.maker), await reviewAs(people.maker), { reviewers: [people.reviewer.id] });
  const signed = holding === 'sign-off'
    ? (await signOff(act(people.mentor), await reviewAs(people.mentor), { holdPoint: '15 V', contentHash: view.contentHash })).value : null;
  const objection = holding === 'objection' ? (await askForChanges(act(people.mentor), await reviewAs(people.mentor), 'Look again.')).value : null;
  const note = async (mustAnswer: boolean) => (await openNote(act(people.mentor), await at(people.mentor), { anchor: { kind: 'spot', x: 0, y: 0 }, body: 'Why?', mustAnswer })).value;
  const thread = await note(false);
  const mustAnswer = holding === 'must-answer' ? await note(true) : null;
  const message = (await listThreadViews(world.db, await at(people.mentor))).find(({ id }) => id === thread)?.messages[0]?.id ?? '';

  const token = newToken();
  await insertGuestLink(world.db, { circuit, tokenHash: tokenHash(token), madeBy: people.maker.id, demo: false, expiresAt: new Date(Date.now() + 3_600_000) });
  return {
    bench: bench.slug, circuit, revision, contentHash: view.contentHash, seq: view.seq, signOff: signed, objection, thread, mustAnswer, message,
    guestCookie: `holdoff-guest=${token}`,
  };
}
