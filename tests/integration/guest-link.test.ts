import { afterAll, beforeAll, expect, it } from 'vitest';
import { insertGuestLink } from '@/db/mutations/guest-links';
import { demoToken } from '@/lib/auth/demo-token';
import { newToken, tokenHash } from '@/lib/auth/token';
import { openDemo, openGuestLink } from '@/lib/http/open-link';
import { getCircuit } from '@/lib/http/operations/circuits';
import { listRevisions } from '@/lib/http/operations/review';
import { replaceChecker } from '@/lib/review/check-copy';
import { ApiWorld } from '../support/api-world';
import { benchWithCircuit, postAs, type BenchWithCircuit } from '../support/bench-with-circuit';
import { checkedWith } from '../support/findings';

let world: ApiWorld;
let here: BenchWithCircuit;
const cookieOf = (response: Response) => (response.headers.get('set-cookie') ?? '').split(';')[0] ?? '';
const later = () => new Date(Date.now() + 60_000);

beforeAll(async () => {
  world = await ApiWorld.start();
  replaceChecker(async () => checkedWith([]));
  here = await benchWithCircuit(world);
});
afterAll(() => world.stop());

it('moves the token from the address into a cookie that reads the one circuit, people as initials, no addresses', async () => {
  const token = newToken();
  await insertGuestLink(world.db, { circuit: here.circuit, tokenHash: tokenHash(token), madeBy: here.maker.id, demo: false, expiresAt: later() });
  const opened = await openGuestLink(world.db, token);
  expect([opened.status, opened.headers.get('location')]).toEqual([303, `/circuits/${here.circuit}`]);
  const circuit = await world.call(cookieOf(opened), getCircuit, { params: { id: here.circuit } });
  expect(circuit).toMatchObject({ status: 200, body: { makers: [{ name: 'IO' }], may: ['read the circuit'] } });
  expect(JSON.stringify(circuit.body)).not.toMatch(/northgate\.test|Okafor/);
  const other = await postAs(world, here.bench, here.maker);
  expect((await world.call(cookieOf(opened), getCircuit, { params: { id: other } })).status).toBe(404);
});

it('opens nothing for a token that is unknown, malformed or past its date', async () => {
  const old = newToken();
  await insertGuestLink(world.db, { circuit: here.circuit, tokenHash: tokenHash(old), madeBy: here.maker.id, demo: false, expiresAt: new Date(Date.now() - 1) });
  for (const token of [newToken(), 'x', old]) {
    const opened = await openGuestLink(world.db, token);
    expect([opened.headers.get('location'), opened.headers.get('set-cookie')]).toEqual(['/', null]);
  }
  expect((await world.call(`holdoff-guest=${old}`, getCircuit, { params: { id: here.circuit } })).status).toBe(401);
});

it('leads from the landing page to the demo circuit, and nowhere where none is seeded', async () => {
  expect((await openDemo(world.db)).headers.get('location')).toBe('/');
  await insertGuestLink(world.db, { circuit: here.circuit, tokenHash: tokenHash(demoToken('x'.repeat(32), here.circuit)), madeBy: here.maker.id, demo: true, expiresAt: later() });
  const opened = await openDemo(world.db);
  expect(opened.headers.get('location')).toBe(`/circuits/${here.circuit}`);
  expect((await world.call(cookieOf(opened), listRevisions, { params: { id: here.circuit } })).status).toBe(200);
});
