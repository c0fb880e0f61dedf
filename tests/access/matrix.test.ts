import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { surface } from '@/lib/http/operations/surface';
import type { Operation } from '@/lib/http/operation';
import { replaceChecker } from '@/lib/review/check-copy';
import { ApiWorld, handlerOf, routeFileOf, routeFiles } from '../support/api-world';
import { checkedWith } from '../support/findings';
import { callers, verdicts, type CallerName } from './matrix';
import { requestOf } from './requests';
import { castOf, sceneOf, type Cast, type Scene } from './scene';

let world: ApiWorld;
let cast: Cast;
const statusOf = { 1: 401, 3: 403, 4: 404 } as const;
const operationOf = (row: string): Operation | undefined => surface.find(({ id }) => id === row.split(',')[0]);

beforeAll(async () => {
  world = await ApiWorld.start();
  replaceChecker(async () => checkedWith([]));
  cast = await castOf(world);
});
afterAll(() => world.stop());

describe('the matrix', () => {
  it('has a row for every call of the surface, and none besides', () => {
    const ids = new Set([...verdicts.keys()].map((row) => row.split(',')[0]));
    expect([...ids].sort()).toEqual(surface.map(({ id }) => id).sort());
  });

  it('covers every route file, and every call has its handler', async () => {
    // The catch-all answers 404 to addresses that are none.
    const files = routeFiles().filter((file) => !file.includes('[...rest]'));
    expect([...new Set(surface.map(routeFileOf))].sort()).toEqual(files.sort());
    for (const operation of surface) await expect(handlerOf(operation)).resolves.toBeTypeOf('function');
  });
});

const cookieFor = (caller: CallerName, scene: Scene): Promise<string | null> | string | null => {
  if (caller === 'nobody') return null;
  return caller === 'guest' ? scene.guestCookie : world.cookieFor(cast.people[caller].id);
};

describe.each([...verdicts])('%s', (row, verdict) => {
  const operation = operationOf(row) as Operation;
  const request = requestOf(row, operation);
  const may = callers.filter((caller) => verdict[caller] === '+');

  it(`is refused to ${callers.filter((caller) => verdict[caller] !== '+').join(', ') || 'nobody'}, with the right status, and changes nothing`, async () => {
    const refused = callers.filter((caller) => verdict[caller] !== '+');
    if (refused.length === 0) return;
    const scene = await sceneOf(world, cast, request.holding);
    for (const caller of refused) {
      const answer = await world.call(await cookieFor(caller, scene), operation, request.options(scene, cast));
      expect(answer.status, caller).toBe(statusOf[verdict[caller] as '1' | '3' | '4']);
      expect(answer.body, caller).toMatchObject({ code: expect.any(String), requestId: expect.any(String) });
    }
  });

  it.each(may)('passes for %s', async (caller) => {
    const scene = await sceneOf(world, cast, request.holding);
    const answer = await world.call(await cookieFor(caller, scene), operation, request.options(scene, cast));
    expect([200, 201, 204], JSON.stringify(answer.body)).toContain(answer.status);
  });
});
