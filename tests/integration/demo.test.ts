import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { demoCircuit } from '@/db/queries/guest-links';
import { editSheet } from '@/lib/rooms/edit-sheet';
import { circuitGate } from '@/lib/access/gates';
import { mintPerson } from '@/lib/access/mint';
import type { Sheet } from '@/lib/document/records';
import { getCircuit, getFindings, listCircuits } from '@/lib/http/operations/circuits';
import { whoAmI } from '@/lib/http/operations/people';
import { askCall, cutCall, getRevision, getRevisionSheet, listRevisions, signOffCall } from '@/lib/http/operations/review';
import type { NetVolts } from '@/lib/check/net-volts';
import type { Finding } from '@/lib/netlist/findings/finding';
import { checkEngine } from '@/lib/review/check-engine';
import type { Circuit } from '@/lib/schemas/circuit';
import type { Revision } from '@/lib/schemas/revision';
import { demoPassword, demoPeople } from '../../scripts/demo/demo-people';
import { seedDemo } from '../../scripts/demo/seed-demo';
import { signIn } from '@/lib/auth/sign-in';
import { ApiWorld } from '../support/api-world';

let world: ApiWorld;
const accounts = demoPeople.map(({ email, key }) => ({ email, key, password: demoPassword() }));
const cookies = new Map<string, string>();
const as = (key: string) => cookies.get(key) ?? '';
let heater = '';

beforeAll(async () => {
  world = await ApiWorld.start();
  await seedDemo(world.db, accounts, 'x'.repeat(32));
  for (const { key, email, password } of accounts) {
    const { token } = await signIn(world.db, { email, password }, { address: key, userAgent: '', requestId: 'test' });
    cookies.set(key, `holdoff-session=${token}`);
  }
  heater = (await demoCircuit(world.db))?.circuitId ?? '';
}, 120_000);
afterAll(async () => {
  await checkEngine().dispose();
  await world.stop();
});

/** The change the demo asks for: 22 kΩ from GATE to 0 V, drawn between two pins that are there. */
function withPullDown(sheet: Sheet): Sheet {
  const model = sheet.parts.find(({ ref }) => ref === 'R2') as Sheet['parts'][number];
  const gate = sheet.parts.find(({ facts }) => facts['name'] === 'GATE') as Sheet['parts'][number];
  const zero = sheet.parts.find(({ kind }) => kind === 'zero-volt') as Sheet['parts'][number];
  const end = (part: string, pin: string) => ({ at: 'pin' as const, part, pin });
  return {
    ...sheet,
    parts: [...sheet.parts, { ...model, id: 'pulldown', ref: 'R5', x: 740, y: 480 }],
    wires: [...sheet.wires, { id: 'up', a: end('pulldown', '1'), b: end(gate.id, '1'), bends: [] }, { id: 'down', a: end('pulldown', '2'), b: end(zero.id, '1'), bends: [] }],
  };
}
const findingsOf = async (scenario?: string) =>
  (await world.call<{ findings: Finding[] }>(as('ines'), getFindings, { params: { id: heater }, ...(scenario ? { query: { scenario } } : {}) })).body.findings;
const stops = (findings: readonly Finding[]) => findings.filter(({ severity }) => severity === 'stop').map(({ rule, holdPoint }) => `${rule} ${holdPoint}`);

describe('the demo bench', () => {
  it('has people who can sign in, in one bench, with their roles', async () => {
    const who = await world.call<{ benches: { slug: string; role: string }[] }>(as('ruth'), whoAmI);
    expect(who.body).toMatchObject({ person: { name: 'Ruth Adeyemi' }, benches: [{ slug: 'northgate', role: 'mentor' }] });
    for (const { password } of accounts) expect(password).toMatch(/^[A-Za-z0-9]{12}$/);
  });

  it('shows circuits in every state, with their open stops and who is waited for', async () => {
    const { items } = (await world.call<{ items: Circuit[] }>(as('lena'), listCircuits, { params: { bench: 'northgate' } })).body;
    expect(items.map(({ title, state, openStops, reached }) => [title.split(',')[0], state, openStops, reached?.holdPoint ?? null])).toEqual([
      ['Induction-heater driver', 'cut', 2, null],
      ['Fume-extractor fan driver', 'signed off', 0, '24 V'],
      ['Kiln interlock relay driver', 'in review', 0, null],
      ['Spot-welder trigger board', 'changes asked', 2, null],
    ]);
    expect(items[1]?.waitingFor).toEqual([]);
    expect(items[2]?.waitingFor.map(({ name }) => name).sort()).toEqual(['Marek Solano', 'Ruth Adeyemi']);
    expect(items[3]?.waitingFor).toMatchObject([{ name: 'Lena Brandt', why: 'changes are asked for' }]);
  });

  it('keeps with a cut what voltages its nets reach, so that a reader sees the hazard without an engine', async () => {
    const [newest] = (await world.call<{ items: Revision[] }>(as('lena'), listRevisions, { params: { id: heater } })).body.items;
    const { volts } = (await world.call<{ volts: NetVolts }>(as('lena'), getRevisionSheet, { params: { id: newest?.id ?? '' } })).body;
    expect(volts['325 V']?.['DC LINK']).toBeCloseTo(325, 0);
    expect(volts['15 V']?.['DC LINK']).toBeCloseTo(15, 1);
  });

  it('stops on the lifted lead at every hold point, and on the indicator higher up only', async () => {
    expect(stops(await findingsOf('15 V'))).toEqual(['lifted-lead 15 V']);
    const all = await findingsOf();
    expect(stops(all).sort()).toEqual(['indicator-at-stage 36 V', 'lifted-lead 15 V']);
    expect(all.find(({ rule }) => rule === 'lifted-lead')?.remedy?.words).toMatch(/22\skΩ from/);
  });

  it('is signed up to the first hold point once the gate is held, and refused above with the reason', async () => {
    const access = await circuitGate(world.db, { person: null, link: { id: 'none', circuitId: heater } }, heater);
    const ines = demoPeople.find(({ key }) => key === 'ines');
    const makers = (await world.call<Circuit>(as('ines'), getCircuit, { params: { id: heater } })).body.makers;
    expect(makers).toMatchObject([{ name: ines?.name }]);
    await editSheet(world.db, access.circuit, { id: mintPerson(makers[0]?.id ?? '') }, withPullDown);
    expect(stops(await findingsOf())).toEqual(['indicator-at-stage 36 V']);

    const revision = (await world.call<Revision>(as('ines'), cutCall, { params: { id: heater }, body: { note: 'Gate held' } })).body;
    expect(revision.letter).toBe('B');
    await world.call(as('ines'), askCall, { params: { id: revision.id }, body: {} });
    const sign = (holdPoint: string) => world.call<{ code?: string; refs?: string[] }>(as('ruth'), signOffCall, { params: { id: revision.id }, body: { holdPoint, contentHash: revision.contentHash } });
    expect((await sign('15 V')).status).toBe(201);
    expect(await sign('325 V')).toMatchObject({ status: 409, body: { code: 'open-stop', refs: ['R1', 'D1'] } });

    await editSheet(world.db, access.circuit, { id: mintPerson(makers[0]?.id ?? '') }, (sheet) => ({ ...sheet, parts: sheet.parts.map((part) => (part.ref === 'R1' ? { ...part, facts: { ...part.facts, value: 1_500 } } : part)) }));
    expect((await world.call<Circuit>(as('kofi'), getCircuit, { params: { id: heater } })).body).toMatchObject({ state: 'signed off', draft: true, reached: { letter: 'B', holdPoint: '15 V' } });
    expect((await world.call<Revision>(as('kofi'), getRevision, { params: { id: revision.id } })).body).toMatchObject({ state: 'signed off', signOffs: [{ holdPoint: '15 V' }] });
    expect((await world.call<{ items: Revision[] }>(as('kofi'), listRevisions, { params: { id: heater } })).body.items.map(({ letter, state }) => `${letter} ${state}`)).toEqual(['B signed off', 'A superseded']);
  });
});
