import { afterAll, beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { getCircuit } from '@/lib/http/operations/circuits';
import { readAudit } from '@/lib/http/operations/people';
import {
  askCall, cutCall, getRevision, liftCall, listRevisions, moveThread, objectCall, openThread, signOffCall, withdrawCall,
} from '@/lib/http/operations/review';
import type { Objection, Requirement, Revision, SignOff } from '@/lib/schemas/revision';
import type { Finding } from '@/lib/netlist/findings/finding';
import { replaceChecker } from '@/lib/review/check-copy';
import { ApiWorld, type TestPerson } from '../support/api-world';
import { benchWithCircuit, changeValue, type BenchWithCircuit } from '../support/bench-with-circuit';
import { checkedWith, findingOf } from '../support/findings';

let world: ApiWorld;
let here: BenchWithCircuit;
let findings: Finding[] = [];

beforeAll(async () => {
  world = await ApiWorld.start();
  replaceChecker(async () => checkedWith(findings));
});
afterAll(() => world.stop());
beforeEach(async () => {
  findings = [];
  here = await benchWithCircuit(world);
});

const cut = async (who = here.maker, body: object = {}) => world.call<Revision>(who, cutCall, { params: { id: here.circuit }, body: { note: 'as drawn', ...body } });
const ask = (id: string, reviewers: readonly string[] = []) => world.call<Revision>(here.maker, askCall, { params: { id }, body: { reviewers } });
async function inReview(): Promise<Revision> {
  const { body } = await cut();
  return (await ask(body.id)).body;
}
const sign = (who: TestPerson | string, revision: Revision, holdPoint = '15 V', more: object = {}) =>
  world.call<SignOff & { code?: string; refs?: string[]; requirements?: Requirement[] }>(who, signOffCall, { params: { id: revision.id }, body: { holdPoint, contentHash: revision.contentHash, ...more } });
const read = async (id: string, who = here.member) => (await world.call<Revision>(who, getRevision, { params: { id } })).body;

describe('cutting', () => {
  it('makes revision A with hash, plan and findings, and answers a repeat at the same seq with the first one', async () => {
    findings = [findingOf({ refs: ['R1'] })];
    const first = await cut();
    expect(first).toMatchObject({ status: 201, body: { letter: 'A', state: 'cut', note: 'as drawn', signOffs: [], counts: { stop: 1 } } });
    expect(first.body.contentHash).toMatch(/^[0-9a-f]{64}$/);
    expect(first.body.holdPoints.map(({ name }) => name)).toEqual(['15 V', '36 V', '85 V']);
    const again = await cut(here.maker, { seq: first.body.seq, note: 'another' });
    expect(again).toMatchObject({ status: 200, body: { id: first.body.id, note: 'as drawn' } });
  });

  it('refuses a seq that is not the head', async () => {
    const { seq } = (await world.call<{ seq: number }>(here.maker, getCircuit, { params: { id: here.circuit } })).body;
    await changeValue(world, here.maker, here.circuit, 2_200);
    expect(await cut(here.maker, { seq })).toMatchObject({ status: 409, body: { code: 'sheet-moved' } });
    expect(await cut(here.maker, { seq: seq + 1 })).toMatchObject({ status: 201, body: { seq: seq + 1 } });
  });

  it('refuses a new cut at an older seq, also where one was cut there; the very same cut sent again has its answer', async () => {
    const first = await cut(here.maker, { note: 'proof stage' });
    await changeValue(world, here.maker, here.circuit, 1_800);
    expect(await cut(here.maker, { seq: first.body.seq, note: 'second' })).toMatchObject({ status: 409, body: { code: 'sheet-moved' } });
    expect(await cut(here.maker, { seq: first.body.seq, note: 'proof stage' })).toMatchObject({ status: 200, body: { id: first.body.id } });
  });

  it('settles two cuts at once: one revision, one answer', async () => {
    const answers = await Promise.all([cut(), cut()]);
    expect(new Set(answers.map(({ body }) => body.id)).size).toBe(1);
    expect(answers.filter(({ status }) => status === 201)).toHaveLength(1);
  });

  it('counts letters on, and lists newest first in pages', async () => {
    for (const ohms of [2_200, 3_300, 4_700]) {
      await cut();
      await changeValue(world, here.maker, here.circuit, ohms);
    }
    const page = await world.call<{ items: Revision[]; next: string | null }>(here.member, listRevisions, { params: { id: here.circuit }, query: { limit: '2' } });
    expect(page.body.items.map(({ letter }) => letter)).toEqual(['C', 'B']);
    const rest = await world.call<{ items: Revision[]; next: string | null }>(here.member, listRevisions, { params: { id: here.circuit }, query: { limit: '2', cursor: page.body.next ?? '' } });
    expect(rest.body).toMatchObject({ items: [{ letter: 'A' }], next: null });
  });
});

describe('asking for review', () => {
  it('puts it in review, supersedes older unsigned ones, and asked twice answers the first', async () => {
    const a = await inReview();
    expect(a.state).toBe('in review');
    expect(await world.call(here.maker, askCall, { params: { id: a.id } })).toMatchObject({ status: 200, body: { id: a.id } });
    expect(await ask(a.id)).toMatchObject({ status: 200, body: { id: a.id } });
    await changeValue(world, here.maker, here.circuit, 2_200);
    const b = await inReview();
    expect((await read(a.id)).state).toBe('superseded');
    expect(await sign(here.mentor, a)).toMatchObject({ status: 409, body: { code: 'newer-revision' } });
    expect((await read(b.id)).state).toBe('in review');
  });

  it('is refused while a check stands in error, and for reviewers who are not on the bench', async () => {
    findings = [findingOf({ outcome: 'error' })];
    const { body } = await cut();
    expect(await ask(body.id)).toMatchObject({ status: 409, body: { code: 'rule-error' } });
    findings = [];
    await changeValue(world, here.maker, here.circuit, 2_200);
    const next = await cut();
    expect(await ask(next.body.id, [here.stranger.id])).toMatchObject({ status: 422, body: { errors: [{ path: 'reviewers.0' }] } });
  });
});

describe('signing off', () => {
  it('signs up to a hold point for 90 days, answers a repeat with the first one, and stays with its revision', async () => {
    const revision = await inReview();
    const signed = await sign(here.mentor, revision, '15 V', { conditions: 'J1 stays plugged.' });
    expect(signed).toMatchObject({ status: 201, body: { holdPoint: '15 V', by: { id: here.mentor.id, name: 'Ruth Adeyemi' }, conditions: 'J1 stays plugged.' } });
    expect(Date.parse(signed.body.until) - Date.parse(signed.body.at)).toBe(90 * 86_400_000);
    expect(await sign(here.mentor, revision)).toMatchObject({ status: 200, body: { id: signed.body.id, conditions: 'J1 stays plugged.' } });
    await changeValue(world, here.maker, here.circuit, 2_200);
    expect((await read(revision.id)).state).toBe('signed off');
    const circuit = await world.call<{ draft: boolean; state: string }>(here.member, getCircuit, { params: { id: here.circuit } });
    expect(circuit.body).toMatchObject({ draft: true, state: 'signed off', reached: { letter: 'A', holdPoint: '15 V', volts: 15 } });
  });

  it('refuses what was never put up for review, an unknown hold point and a foreign hash', async () => {
    const { body } = await cut();
    expect(await sign(here.mentor, body)).toMatchObject({ status: 409, body: { code: 'not-in-review' } });
    await ask(body.id);
    expect(await sign(here.mentor, body, '12 V')).toMatchObject({ status: 422 });
    expect(await sign(here.mentor, { ...body, contentHash: '0'.repeat(64) })).toMatchObject({ status: 409, body: { code: 'stale-hash' } });
    expect(await sign(here.mentor, body, '15 V', { until: '2020-01-01' })).toMatchObject({ status: 422, body: { errors: [{ path: 'until' }] } });
  });

  it('is refused at and above an open stop, with its refs, and passes below', async () => {
    findings = [findingOf({ refs: ['R1', 'D1'], holdPoint: '36 V', fromVolts: 36 })];
    const revision = await inReview();
    const refused = await sign(here.mentor, revision, '85 V');
    expect(refused).toMatchObject({ status: 409, body: { code: 'open-stop', refs: ['R1', 'D1'] } });
    expect(refused.body.requirements?.find(({ id, holdPoint }) => id === 'open-stop' && holdPoint === '85 V')).toMatchObject({ result: 'not satisfied', refs: ['R1', 'D1'] });
    expect((await sign(here.mentor, revision, '15 V')).status).toBe(201);
  });

  it('is refused to contributors: makers past and present, whoever edited', async () => {
    const { mentor, steward, secondMentor } = here;
    const { putMakers } = await import('@/lib/http/operations/circuits');
    const makers = (ids: string[]) => world.call(steward, putMakers, { params: { id: here.circuit }, body: { makers: ids } });
    expect((await makers([mentor.id])).status).toBe(200);
    await changeValue(world, mentor, here.circuit, 2_200);
    expect((await makers([])).status).toBe(200);
    const revision = await inReview();
    expect(revision.contributors.map(({ id }) => id).sort()).toEqual([here.maker.id, mentor.id].sort());
    expect(await sign(mentor, revision)).toMatchObject({ status: 403, body: { code: 'contributor' } });
    expect((await sign(secondMentor, revision)).status).toBe(201);
  });

  it('wants a session signed in within 12 hours', async () => {
    const revision = await inReview();
    const stale = await world.cookieFor(here.mentor.id, new Date(Date.now() - 13 * 3_600_000));
    expect(await sign(stale, revision)).toMatchObject({ status: 403, body: { code: 'sign-in-again' } });
  });

  it('settles two mentors at once: one wins, the other is told why', async () => {
    const revision = await inReview();
    const answers = await Promise.all([sign(here.mentor, revision), sign(here.secondMentor, revision)]);
    expect(answers.map(({ status }) => status).sort()).toEqual([201, 409]);
    expect(answers.find(({ status }) => status === 409)?.body.code).toBe('already-signed');
    expect((await read(revision.id)).signOffs).toHaveLength(1);
  });

  it('settles one mentor’s double submit: one sign-off, both answered with it', async () => {
    const revision = await inReview();
    const answers = await Promise.all([sign(here.mentor, revision), sign(here.mentor, revision), sign(here.mentor, revision)]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 200, 201]);
    expect(new Set(answers.map(({ body }) => body.id)).size).toBe(1);
  });

  it('is withdrawn by its signer, or by a steward with a reason, and makes the revision withdrawn', async () => {
    const revision = await inReview();
    const { body } = await sign(here.mentor, revision);
    const withdraw = (who: TestPerson, reason?: string) => world.call<SignOff>(who, withdrawCall, { params: { id: body.id }, body: reason === undefined ? {} : { reason } });
    expect((await withdraw(here.secondMentor)).status).toBe(403);
    expect((await withdraw(here.maker)).status).toBe(403);
    expect((await withdraw(here.steward)).status).toBe(422);
    expect(await withdraw(here.steward, 'Wrong part fitted.')).toMatchObject({ status: 200, body: { id: body.id, withdrawReason: 'Wrong part fitted.' } });
    expect((await withdraw(here.steward, 'again')).status).toBe(200);
    expect(await withdraw(here.mentor)).toMatchObject({ status: 409, body: { code: 'already-withdrawn' } });
    expect((await read(revision.id)).state).toBe('withdrawn');
    expect(await sign(here.secondMentor, revision)).toMatchObject({ status: 409, body: { code: 'not-in-review' } });
  });
});

describe('asking for changes', () => {
  const object = (who: TestPerson, id: string, reason = 'Gate floats.') => world.call<Objection>(who, objectCall, { params: { id }, body: { reason } });
  const lift = (who: TestPerson, id: string, reason?: string) => world.call<Objection>(who, liftCall, { params: { id }, body: reason === undefined ? {} : { reason } });

  it('sticks over later revisions until the same person lifts it', async () => {
    const a = await inReview();
    const { body, status } = await object(here.mentor, a.id);
    expect(status).toBe(201);
    expect((await read(a.id)).state).toBe('changes asked');
    await changeValue(world, here.maker, here.circuit, 2_200);
    const b = await inReview();
    expect(b.state).toBe('changes asked');
    expect(await sign(here.secondMentor, b)).toMatchObject({ status: 409, body: { code: 'objection', refs: [body.id] } });
    expect((await lift(here.secondMentor, body.id)).status).toBe(403);
    expect((await lift(here.mentor, body.id)).status).toBe(200);
    expect((await read(b.id)).state).toBe('in review');
    expect((await sign(here.secondMentor, b)).status).toBe(201);
  });

  it('is overridden by a steward with a reason that stays visible', async () => {
    const a = await inReview();
    const { body } = await object(here.mentor, a.id);
    expect((await lift(here.steward, body.id)).status).toBe(422);
    expect(await lift(here.steward, body.id, 'Checked on the bench.')).toMatchObject({ status: 200, body: { overrideReason: 'Checked on the bench.' } });
    const view = await read(a.id);
    expect(view.requirements.find(({ id }) => id === 'objection')).toMatchObject({ result: 'overridden', refs: [body.id] });
    expect(view.objections[0]).toMatchObject({ overrideReason: 'Checked on the bench.' });
    expect((await sign(here.mentor, a)).status).toBe(201);
  });

  it('is open to a member who is named as reviewer, and to nobody else but mentors', async () => {
    const { body } = await cut();
    await ask(body.id, [here.member.id]);
    expect((await object(here.member, body.id)).status).toBe(201);
    expect((await object(here.member, body.id, 'twice')).status).toBe(200);
    expect((await object(here.maker, body.id)).status).toBe(403);
    expect((await object(here.steward, body.id)).status).toBe(403);
  });
});

describe('notes that must be answered', () => {
  it('gate a sign-off, whichever revision they were written on, and are resolved by their opener or a mentor apart', async () => {
    const revision = await inReview();
    const opened = await world.call<{ id: string; revision: { letter: string } }>(here.member, openThread, {
      params: { id: here.circuit }, body: { anchor: { kind: 'part', id: 'R1' }, body: 'Why 1 kΩ?', mustAnswer: true },
    });
    expect(opened).toMatchObject({ status: 201, body: { revision: { letter: 'A' }, status: 'open' } });
    expect(await sign(here.mentor, revision)).toMatchObject({ status: 409, body: { code: 'must-answer', refs: [opened.body.id] } });
    const move = (who: TestPerson, status: string) => world.call(who, moveThread, { params: { id: opened.body.id }, body: { status } });
    expect((await move(here.maker, 'resolved')).status).toBe(403);
    expect((await move(here.steward, 'resolved')).status).toBe(403);
    expect((await move(here.maker, 'answered')).status).toBe(200);
    expect((await sign(here.mentor, revision)).status).toBe(409);
    expect((await move(here.mentor, 'resolved')).status).toBe(200);
    expect((await sign(here.mentor, revision)).status).toBe(201);
  });
});

describe('the audit record', () => {
  it('has a row for every act, and shows a member only their own circuits', async () => {
    const revision = await inReview();
    const { body } = await sign(here.mentor, revision);
    const rows = (await world.call<{ items: { action: string; detail: Record<string, unknown>; by: { id: string } }[] }>(here.steward, readAudit, { params: { bench: here.bench.slug } })).body.items;
    expect(rows.map(({ action }) => action)).toEqual(['signed off', 'asked for review', 'cut a revision', 'posted the circuit']);
    expect(rows[0]).toMatchObject({ by: { id: here.mentor.id }, detail: { signOff: body.id, contentHash: revision.contentHash } });
    expect((await world.call<{ items: unknown[] }>(here.maker, readAudit, { params: { bench: here.bench.slug } })).body.items).toHaveLength(4);
    expect((await world.call<{ items: unknown[] }>(here.member, readAudit, { params: { bench: here.bench.slug } })).body.items).toHaveLength(0);
  });
});
