import { sql } from 'drizzle-orm';
import { afterAll, afterEach, beforeAll, describe, expect, it } from 'vitest';
import { readStoredRoom } from '@/db/queries/room-state';
import { buildDocument } from '@/realtime/server/room/load-room';
import { SheetCopy } from '@/realtime/testing/sheet-copy';
import { Page, pageWorld } from './support/page';
import { SheetWorld } from './support/sheet-world';

let world: SheetWorld;
const pages: Page[] = [];
beforeAll(async () => { world = await SheetWorld.start(); });
afterAll(() => world.stop());
afterEach(() => pages.splice(0).forEach((page) => page.close()));

async function open(circuitId: string, actor: { personId: string; sessionId: string }): Promise<Page> {
  const page = new Page(pageWorld(world), circuitId, actor);
  pages.push(page);
  await page.loaded();
  return page;
}

const storedRefs = async (circuitId: string) => {
  const copy = new SheetCopy();
  for (const update of (await readStoredRoom(world.db, circuitId))?.updates ?? []) copy.receive(update);
  return copy.refs();
};

describe('MariaDB killed during edits', () => {
  it('nothing acknowledged is lost, nothing is called saved that is not, and all goes out when it is back', async () => {
    const { circuitId, maker, coMaker, member } = await world.freshPeople();
    const [one, two] = [await open(circuitId, maker), await open(circuitId, coMaker)];
    const reader = await open(circuitId, member);
    let number = 0;
    for (let kill = 0; kill < 3; kill += 1) {
      const typing = setInterval(() => {
        if (one.now.editable) one.addResistor(`R${(number += 1)}`);
        if (two.now.editable) two.addResistor(`C${number}`);
      }, 3);
      await one.until('edits to be under way', ({ seq }) => seq > kill * 40);
      await world.server.kill();
      await one.until('not saved to be said', ({ save }) => save.state === 'not saved');
      clearInterval(typing);
      one.addResistor(`R${(number += 1)}`);
      expect(one.now.save.state).toBe('not saved');
      await world.server.restart();
      await one.saved(20_000);
      await two.saved(20_000);
    }
    const refs = one.refs();
    expect(refs).toContain(`R${number}`);
    expect(new Set(refs).size).toBe(refs.length);
    expect(await storedRefs(circuitId)).toEqual(refs);
    await two.until('the same sheet', () => two.refs().length === refs.length);
    await reader.until('the same sheet', () => reader.refs().length === refs.length);
    expect(one.now.refused).toEqual([]);
    expect(buildDocument((await readStoredRoom(world.db, circuitId))?.updates ?? []).getMap('parts').size).toBe(refs.length);
  }, 90_000);
});

describe('a database that answers but takes no rows', () => {
  it('the page says so, keeps the edit and sends it once there is room again', async () => {
    const { circuitId, maker, member } = await world.freshPeople();
    const [page, reader] = [await open(circuitId, maker), await open(circuitId, member)];
    page.addResistor('R1');
    await page.saved();
    await world.db.execute(sql.raw(`create trigger disk_full before insert on rt_update for each row
      signal sqlstate '45000' set mysql_errno = 1021, message_text = 'Disk full'`));
    page.addResistor('R2');
    const { save } = await page.until('not saved to be said', (now) => now.save.state === 'not saved');
    expect(save).toMatchObject({ edits: 1, why: 'The database does not take edits.' });
    page.addResistor('R3');
    expect(reader.refs()).toEqual(['R1']);
    expect(await storedRefs(circuitId)).toEqual(['R1']);
    expect((await world.internal('/internal/append', {
      circuitId, actorId: maker.personId, sessionId: maker.sessionId, key: 'k', update: Buffer.from(new SheetCopy().addResistor('R9')).toString('base64'),
    })).status).toBe(503);
    await world.db.execute(sql.raw('drop trigger disk_full'));
    await page.saved();
    await reader.shows('R3');
    expect(await storedRefs(circuitId)).toEqual(['R1', 'R2', 'R3']);
  });

  it('a commit that hangs is not called saving for long, and is saved when it is through', async () => {
    const { circuitId, maker } = await world.freshPeople();
    const page = await open(circuitId, maker);
    let release = (): void => {};
    const held = new Promise<void>((resolve) => { release = resolve; });
    let taken = (): void => {};
    const locked = new Promise<void>((resolve) => { taken = resolve; });
    const lock = world.db.transaction(async (tx) => {
      await tx.execute(sql`select * from rt_room where room_id = ${circuitId} for update`);
      taken();
      await held;
    });
    await locked;
    page.addResistor('R1');
    await page.until('not saved to be said', ({ save }) => save.state === 'not saved', 4_000);
    page.addResistor('R2');
    release();
    await lock;
    await page.saved();
    expect(await storedRefs(circuitId)).toEqual(['R1', 'R2']);
  });
});

it('a restart of the realtime server is announced, and everyone comes back', async () => {
  const { circuitId, maker, member } = await world.freshPeople();
  const [page, reader] = [await open(circuitId, maker), await open(circuitId, member)];
  for (let number = 1; number <= 30; number += 1) page.addResistor(`R${number}`);
  await world.restartRealtime();
  page.addResistor('R31');
  await page.saved();
  await reader.until('all of it', () => reader.refs().length === 31);
  expect(await storedRefs(circuitId)).toHaveLength(31);
});
