import { eq } from 'drizzle-orm';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { idempotency } from '@/db/schema/audit';
import { sessions, signInDelays } from '@/db/schema/people';
import { tidy } from '@/lib/circuits/housekeeping';
import { watchSheets } from '@/lib/circuits/watch-sheets';
import { getCircuit } from '@/lib/http/operations/circuits';
import { replaceChecker } from '@/lib/review/check-copy';
import type { Circuit } from '@/lib/schemas/circuit';
import { ApiWorld } from '../support/api-world';
import { benchWithCircuit, changeValue, type BenchWithCircuit } from '../support/bench-with-circuit';
import { checkedWith, findingOf } from '../support/findings';

let world: ApiWorld;
let here: BenchWithCircuit;

beforeAll(async () => {
  world = await ApiWorld.start();
  replaceChecker(async ({ parts }) => checkedWith(Number(parts.find(({ ref }) => ref === 'R1')?.facts.value) > 2_000
    ? [findingOf({ fromVolts: 36, holdPoint: '36 V' }), findingOf({ fingerprint: 'x', severity: 'caution' }), findingOf({ fingerprint: 'y', outcome: 'pass' })] : []));
  here = await benchWithCircuit(world);
});
afterAll(() => world.stop());

it('checks a sheet that has been quiet, and keeps its counts with their seq', async () => {
  const read = async () => (await world.call<Circuit>(here.member, getCircuit, { params: { id: here.circuit } })).body;
  expect((await read()).openStops).toBeNull();
  const stop = watchSheets(world.db);
  try {
    await expect.poll(async () => (await read()).openStops, { timeout: 15_000, interval: 100 }).toBe(0);
    const seq = await changeValue(world, here.maker, here.circuit, 2_200);
    await expect.poll(async () => (await read()).counts, { timeout: 15_000, interval: 100 }).toEqual({ stop: 1, caution: 1, advice: 0, seq });
    expect(await read()).toMatchObject({ openStops: 1, blockedAt: 36 });
    expect(world.rooms.announced).toContainEqual(expect.objectContaining({ circuitId: here.circuit, topic: 'circuit' }));
  } finally {
    stop();
  }
});

it('tidies what has run out and nothing else', async () => {
  const now = new Date();
  const long = new Date(now.getTime() - 2 * 86_400_000);
  await world.cookieFor(here.maker.id, new Date(now.getTime() - 31 * 86_400_000));
  await world.db.insert(signInDelays).values([{ id: 'a'.repeat(64), failures: 9, waitUntil: long, lastAt: long }, { id: 'b'.repeat(64), failures: 1, waitUntil: now, lastAt: now }]);
  await world.db.insert(idempotency).values([
    { personId: here.maker.id, key: 'old', requestHash: 'c'.repeat(64), done: true, createdAt: long },
    { personId: here.maker.id, key: 'cut off', requestHash: 'c'.repeat(64), createdAt: new Date(now.getTime() - 120_000) },
    { personId: here.maker.id, key: 'new', requestHash: 'c'.repeat(64), createdAt: now },
  ]);
  await tidy(world.db, now);
  expect((await world.db.select().from(sessions).where(eq(sessions.userId, here.maker.id)))).toHaveLength(1);
  expect((await world.db.select({ failures: signInDelays.failures }).from(signInDelays))).toEqual([{ failures: 1 }]);
  expect((await world.db.select({ key: idempotency.key }).from(idempotency))).toEqual([{ key: 'cut off' }, { key: 'new' }]);
});
