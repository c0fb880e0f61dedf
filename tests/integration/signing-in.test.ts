import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { ulid } from 'ulid';
import { insertPerson } from '@/db/mutations/benches';
import { inTransaction } from '@/db/transaction';
import { hashPassword } from '@/lib/auth/password';
import { endSessions, listSessions, signInCall, signOutCall, whoAmI } from '@/lib/http/operations/people';
import { ApiWorld } from '../support/api-world';

let world: ApiWorld;
const password = 'a password of some length';
let address = 0;
/** Every test comes from an address of its own, so that waits do not meet. */
const from = () => ({ 'x-forwarded-for': `192.0.2.${(address += 1)}` });

async function account(): Promise<{ id: string; email: string }> {
  const id = ulid();
  const email = `${id.toLowerCase()}@northgate.test`;
  await inTransaction(world.db, async (tx) => insertPerson(tx, { id, email, name: 'Ines Okafor', passwordHash: await hashPassword(password) }));
  return { id, email };
}
const spent = (start: NodeJS.CpuUsage): number => {
  const { user, system } = process.cpuUsage(start);
  return user + system;
};
const cookieOf = (headers: Headers) => (headers.get('set-cookie') ?? '').split(';')[0] ?? '';

beforeAll(async () => { world = await ApiWorld.start(); });
afterAll(() => world.stop());

describe('signing in', () => {
  it('answers who it is, sets a cookie that only the browser sees, and signs out', async () => {
    const { id, email } = await account();
    const answer = await world.call(null, signInCall, { body: { email: email.toUpperCase(), password }, headers: from() });
    expect(answer).toMatchObject({ status: 201, body: { person: { id, name: 'Ines Okafor', email }, benches: [] } });
    expect(answer.headers.get('set-cookie')).toMatch(/^holdoff-session=[\w-]{22}; Path=\/; HttpOnly; SameSite=Lax; Max-Age=2592000$/);
    const cookie = cookieOf(answer.headers);
    expect(await world.call(cookie, whoAmI)).toMatchObject({ status: 200, body: { person: { id } } });
    expect((await world.call(cookie, signOutCall)).status).toBe(204);
    expect(await world.call(cookie, whoAmI)).toMatchObject({ status: 401, body: { code: 'not-signed-in' } });
  });

  it('answers an unknown address and a wrong password alike', async () => {
    const { email } = await account();
    const wrong = await world.call(null, signInCall, { body: { email, password: 'wrong' }, headers: from() });
    const unknown = await world.call(null, signInCall, { body: { email: 'nobody@northgate.test', password: 'wrong' }, headers: from() });
    const { requestId: _, ...first } = wrong.body as Record<string, unknown>;
    const { requestId: __, ...second } = unknown.body as Record<string, unknown>;
    expect(wrong.status).toBe(401);
    expect(second).toEqual(first);
  });

  it('does the same work whether or not the account exists', async () => {
    const { email } = await account();
    const fastest = { [email]: Infinity, 'nobody@northgate.test': Infinity };
    // Processor time, in turn: what else the machine does meanwhile counts for neither.
    for (let round = 0; round < 8; round += 1) {
      for (const address of Object.keys(fastest)) {
        const start = process.cpuUsage();
        await world.call(null, signInCall, { body: { email: address, password: 'wrong' }, headers: from() });
        fastest[address] = Math.min(fastest[address] ?? Infinity, spent(start));
      }
    }
    const [known = 0, unknown = 0] = Object.values(fastest);
    expect(Math.max(known, unknown) / Math.min(known, unknown)).toBeLessThan(1.7);
  });

  it('delays by account and address together, so that nobody is locked out by others', async () => {
    const { email } = await account();
    const attacker = from();
    for (let attempt = 0; attempt < 5; attempt += 1) {
      expect((await world.call(null, signInCall, { body: { email, password: 'wrong' }, headers: attacker })).status).toBe(401);
    }
    const waiting = await world.call(null, signInCall, { body: { email, password }, headers: attacker });
    expect(waiting).toMatchObject({ status: 429, body: { code: 'too-many' } });
    expect(Number(waiting.headers.get('retry-after'))).toBeGreaterThan(0);
    expect((await world.call(null, signInCall, { body: { email, password }, headers: from() })).status).toBe(201);
  });

  it('waits just as long for an address that has no account', async () => {
    const headers = from();
    const statuses: number[] = [];
    for (let attempt = 0; attempt < 6; attempt += 1) {
      statuses.push((await world.call(null, signInCall, { body: { email: 'ghost@northgate.test', password: 'x' }, headers })).status);
    }
    expect(statuses).toEqual([401, 401, 401, 401, 401, 429]);
  });

  it('lists one’s sessions and ends all others', async () => {
    const { email } = await account();
    const cookies = [];
    for (let round = 0; round < 3; round += 1) cookies.push(cookieOf((await world.call(null, signInCall, { body: { email, password }, headers: from() })).headers));
    const [mine, other, third] = cookies as [string, string, string];
    const list = await world.call<{ items: { id: string; current: boolean }[] }>(mine, listSessions);
    expect(list.body.items.map(({ current }) => current)).toEqual([true, false, false]);
    expect((await world.call(mine, endSessions, { body: { id: list.body.items[1]?.id } })).status).toBe(204);
    expect((await world.call(other, whoAmI)).status).toBe(401);
    expect((await world.call(third, whoAmI)).status).toBe(200);
    expect((await world.call(mine, endSessions)).status).toBe(204);
    expect((await world.call(third, whoAmI)).status).toBe(401);
    expect((await world.call(mine, whoAmI)).status).toBe(200);
    expect(world.rooms.revoked.length).toBeGreaterThanOrEqual(2);
  });

  it('ends a session at its absolute limit, whatever the use', async () => {
    const { id } = await account();
    const old = await world.cookieFor(id, new Date(Date.now() - 31 * 86_400_000));
    expect((await world.call(old, whoAmI)).status).toBe(401);
  });

  it('refuses a write from another origin, and a body that is not JSON', async () => {
    const { email } = await account();
    expect(await world.call(null, signInCall, { body: { email, password }, headers: { origin: 'http://evil.test' } })).toMatchObject({ status: 403, body: { code: 'cross-origin' } });
    expect(await world.call(null, signInCall, { body: { email, password }, headers: { 'content-type': 'text/plain' } })).toMatchObject({ status: 415 });
    expect(await world.call(null, signInCall, { body: '{"email"', headers: from() })).toMatchObject({ status: 422, body: { code: 'input-wrong' } });
    expect(await world.call(null, signInCall, { body: { email: 'no', password: 'x' }, headers: from() })).toMatchObject({ status: 422, body: { errors: [{ path: 'email' }] } });
  });
});
