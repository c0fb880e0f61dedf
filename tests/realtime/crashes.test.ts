import { afterAll, beforeAll, expect, it } from 'vitest';
import { issueRoomTicket } from '@/db/mutations/room-ticket';
import { openDatabase, type Connection } from '@/db/client';
import { readStoredRoom } from '@/db/queries/room-state';
import { SheetCopy } from '@/realtime/testing/sheet-copy';
import { startTemporaryServer } from '../../scripts/mariadb/temporary-server.mjs';
import { Browser, Page, type PageWorld } from './support/page';
import { addSheetPeople } from './support/people-of-the-sheet';
import { RealtimeProcess } from './support/realtime-process';
import { makeDatabase, type DurableServer } from './support/sheet-world';

let server: DurableServer;
let connection: Connection;
let realtime: RealtimeProcess;

beforeAll(async () => {
  server = await startTemporaryServer({ durable: true });
  const address = await makeDatabase(server);
  connection = openDatabase(address);
  realtime = await RealtimeProcess.start(address);
});
afterAll(async () => {
  await realtime.stop();
  await connection.close();
  await server.stop();
});

const pageWorld: PageWorld = {
  async ticketFor(circuitId, actor) {
    const issued = await issueRoomTicket(connection.db, circuitId, actor);
    return issued ? { ticket: issued.ticket, url: `ws://127.0.0.1:${realtime.port}/sheet/${circuitId}` } : { refused: 'No.' };
  },
};

/** What was in the sheet's committed state when the page said 'saved' of it. */
async function storedRefs(circuitId: string): Promise<string[]> {
  const copy = new SheetCopy();
  for (const update of (await readStoredRoom(connection.db, circuitId))?.updates ?? []) copy.receive(update);
  return copy.refs();
}

it('kill -9 at any moment during edits loses nothing that was acknowledged and repeats nothing', async () => {
  const { circuitId, maker, coMaker } = await addSheetPeople(connection.db);
  const browser = new Browser();
  let one = new Page(pageWorld, circuitId, maker, browser);
  const two = new Page(pageWorld, circuitId, coMaker);
  await one.loaded();
  await two.loaded();
  let number = 0;
  let acknowledged: string[] = [];
  for (let round = 0; round < 8; round += 1) {
    const target = number + 5 + Math.floor(Math.random() * 25);
    while (number < target) {
      number += 1;
      one.addResistor(`R${number}`);
      two.addResistor(`C${number}`);
      // Every pause is another moment of the server's work to be killed in.
      await new Promise((resolve) => setTimeout(resolve, Math.random() * 4));
      if (one.now.save.state === 'saved') acknowledged = one.refs().filter((ref) => ref.startsWith('R'));
    }
    await realtime.end('SIGKILL');
    const stored = await storedRefs(circuitId);
    expect(acknowledged.filter((ref) => !stored.includes(ref))).toEqual([]);
    one.addResistor(`R${(number += 1)}`);
    two.addResistor(`C${number}`);
    if (round % 3 === 2) {
      one.close();
      one = new Page(pageWorld, circuitId, maker, browser);
    }
    await realtime.launch();
    await one.saved(20_000);
    await two.saved(20_000);
    await one.loaded();
  }
  const all = await storedRefs(circuitId);
  expect(all).toHaveLength(2 * number);
  await one.until('everything', () => one.refs().length === all.length);
  await two.until('everything', () => two.refs().length === all.length);
  expect(one.refs()).toEqual(all);
  expect([...one.now.refused, ...two.now.refused]).toEqual([]);
  one.close();
  two.close();
}, 120_000);

it('SIGTERM commits what was taken in, tells the pages and ends cleanly', async () => {
  const { circuitId, maker } = await addSheetPeople(connection.db);
  const page = new Page(pageWorld, circuitId, maker);
  await page.loaded();
  for (let number = 1; number <= 20; number += 1) page.addResistor(`R${number}`);
  expect(await realtime.end('SIGTERM')).toBe(0);
  await page.until('the line to be gone', ({ line }) => line.state === 'connecting' && line.why.includes('restarting'));
  await realtime.launch();
  await page.saved();
  expect(await storedRefs(circuitId)).toHaveLength(20);
  page.close();
});
