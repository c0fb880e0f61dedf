import { and, eq } from 'drizzle-orm';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import { appendRows } from '@/db/mutations/room-append';
import type { RoomActor } from '@/db/queries/room-grant';
import { readUpdatesAfter } from '@/db/queries/room-state';
import { circuitMakers, circuits, guestLinks } from '@/db/schema/circuits';
import { memberships, sessions } from '@/db/schema/people';
import { SheetCopy } from '@/realtime/testing/sheet-copy';
import { Page, pageWorld, type Browser } from './support/page';
import { addSession, type SheetPeople } from './support/people-of-the-sheet';
import { SheetWorld } from './support/sheet-world';

let world: SheetWorld;
const pages: Page[] = [];
beforeAll(async () => { world = await SheetWorld.start(); });
afterAll(() => world.stop());
afterEach(() => pages.splice(0).forEach((page) => page.close()));

function open(circuitId: string, actor: RoomActor, browser?: Browser): Page {
  const page = new Page(pageWorld(world), circuitId, actor, browser);
  pages.push(page);
  return page;
}

/** The bound that people are promised. */
const bound = 5_000;

const removals: Record<string, (people: SheetPeople) => Promise<unknown>> = {
  'the session ends': ({ coMaker }) => world.db.delete(sessions).where(eq(sessions.id, coMaker.sessionId)),
  'the session runs out': ({ coMaker }) => world.db.update(sessions).set({ expiresAt: new Date() }).where(eq(sessions.id, coMaker.sessionId)),
  'the person leaves the bench': ({ benchId, coMaker }) =>
    world.db.delete(memberships).where(and(eq(memberships.benchId, benchId), eq(memberships.personId, coMaker.personId))),
};

const removeCoMaker = ({ circuitId, coMaker }: SheetPeople) => world.db.update(circuitMakers).set({ standing: null, endedAt: new Date() })
  .where(and(eq(circuitMakers.circuitId, circuitId), eq(circuitMakers.personId, coMaker.personId)));

describe('while connected', () => {
  it.each(Object.keys(removals))('a socket is closed for good when %s', async (name) => {
    const people = await world.freshPeople();
    const socket = await world.enter(people.circuitId, people.coMaker);
    await removals[name]?.(people);
    expect((await socket.closing(bound)).code).toBe(4401);
  });

  it('a socket closes at once when web says so', async () => {
    const people = await world.freshPeople();
    const [socket, other] = [await world.enter(people.circuitId, people.coMaker), await world.enter(people.circuitId, people.maker)];
    await removals['the session ends']?.(people);
    expect((await world.internal('/internal/revoke', { sessionId: people.coMaker.sessionId })).status).toBe(204);
    expect((await socket.closing(500)).code).toBe(4401);
    expect(other.closed).toBeUndefined();
  });

  it('a guest goes when the link ends', async () => {
    const people = await world.freshPeople();
    const socket = await world.enter(people.circuitId, people.guest);
    await world.db.update(guestLinks).set({ endedAt: new Date() }).where(eq(guestLinks.id, people.guest.guestLinkId));
    expect((await socket.closing(bound)).code).toBe(4401);
  });

  it('a removed co-maker comes back as a reader, and what they drew meanwhile is refused and kept', async () => {
    const people = await world.freshPeople();
    const page = open(people.circuitId, people.coMaker);
    await page.loaded();
    expect(page.now.editable).toBe(true);
    await removeCoMaker(people);
    page.addResistor('R1');
    await page.until('the refusal', ({ refused }) => refused.length === 1, bound + 2_000);
    await page.until('a fresh copy', ({ line, role, loaded }) => line.state === 'open' && role === 'reader' && loaded);
    expect(page.now.refused[0]).toMatchObject({ reason: 'role' });
    expect(page.refs()).toEqual([]);
    expect(await readUpdatesAfter(world.db, people.circuitId, 0)).toEqual([]);

    await world.db.update(circuitMakers).set({ standing: 1, endedAt: null })
      .where(and(eq(circuitMakers.circuitId, people.circuitId), eq(circuitMakers.personId, people.coMaker.personId)));
    await page.until('to be a maker again', ({ editable }) => editable, bound + 2_000);
    expect(await page.session.tryAgain(page.now.refused[0]?.id ?? '')).toBe(true);
    await page.saved();
    expect(page.refs()).toEqual(['R1']);
  });

  it('a change of role that takes nothing away loses nothing', async () => {
    const people = await world.freshPeople();
    const page = open(people.circuitId, people.coMaker);
    await page.loaded();
    await world.db.update(memberships).set({ role: 'mentor', version: 2 })
      .where(and(eq(memberships.benchId, people.benchId), eq(memberships.personId, people.coMaker.personId)));
    page.addResistor('R1');
    await page.saved(bound + 2_000);
    expect(page.now.refused).toEqual([]);
    expect(page.refs()).toEqual(['R1']);
  });

  it('an archived circuit takes no more edits', async () => {
    const people = await world.freshPeople();
    const page = open(people.circuitId, people.maker);
    await page.loaded();
    await world.db.update(circuits).set({ archivedAt: new Date() }).where(eq(circuits.id, people.circuitId));
    page.addResistor('R1');
    await page.until('the refusal', ({ refused, role }) => refused.length === 1 && role === 'reader', bound + 2_000);
  });
});

describe('between the gate and the commit', () => {
  it('a revoked actor fails alone; the rest of the batch is stored', async () => {
    const people = await world.freshPeople();
    const [kept, lost] = [open(people.circuitId, people.maker), open(people.circuitId, people.coMaker)];
    await kept.loaded();
    await lost.loaded();
    await removeCoMaker(people);
    kept.addResistor('R1');
    lost.addResistor('R2');
    kept.addResistor('R3');
    await kept.saved();
    await lost.until('the refusal', ({ refused }) => refused.length === 1, bound + 2_000);
    const rows = await readUpdatesAfter(world.db, people.circuitId, 0);
    expect(rows.map((row) => row.actorId)).toEqual([people.maker.personId, people.maker.personId]);
    expect(kept.refs()).toEqual(['R1', 'R3']);
  });

  it('no row is committed after the commit that took the right away, whichever comes first', async () => {
    for (let round = 0; round < 20; round += 1) {
      const people = await world.freshPeople();
      const sessionId = await addSession(world.db, people.coMaker.personId);
      const row = {
        instanceId: 'x', clientSeq: 1, electrical: true, bytes: new SheetCopy().addResistor('R1'),
        actor: { personId: people.coMaker.personId, sessionId, grantVersion: 'member.1.maker.-' },
      };
      const [outcome] = await Promise.all([appendRows(world.db, people.circuitId, 0, [row]), removeCoMaker(people)]);
      const second = await appendRows(world.db, people.circuitId, outcome.kind === 'committed' ? 1 : 0, [{ ...row, clientSeq: 2 }]);
      expect(second).toMatchObject({ kind: 'refused' });
      expect((await readUpdatesAfter(world.db, people.circuitId, 0)).length).toBe(outcome.kind === 'committed' ? 1 : 0);
    }
  });
});
