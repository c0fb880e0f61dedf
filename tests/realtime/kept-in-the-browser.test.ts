import { chromium, type Browser, type BrowserContext, type Page } from '@playwright/test';
import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import { build } from 'esbuild';
import path from 'node:path';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { issueRoomTicket } from '@/db/mutations/room-ticket';
import { waitFor } from '@/realtime/testing/wait-for';
import { findProgram } from '../../scripts/machine/debian-packages.mjs';
import type { PersonActor, SheetPeople } from './support/people-of-the-sheet';
import { SheetWorld } from './support/sheet-world';

let world: SheetWorld;
let site: Server;
let siteUrl: string;
let browser: Browser;
let script: string;
let offline = false;

beforeAll(async () => {
  site = createServer((_request, response) => response.setHeader('content-type', 'text/html').end('<!doctype html><title>Sheet</title>'));
  await new Promise<void>((resolve) => site.listen(0, '127.0.0.1', resolve));
  siteUrl = `http://127.0.0.1:${(site.address() as AddressInfo).port}`;
  world = await SheetWorld.start({}, siteUrl);
  const root = path.resolve(import.meta.dirname, '../..');
  const built = await build({
    absWorkingDir: root, entryPoints: ['tests/realtime/support/sheet-in-browser.ts'], bundle: true, write: false, format: 'iife', logLevel: 'warning',
  });
  script = built.outputFiles[0]?.text ?? '';
  browser = await chromium.launch({
    executablePath: findProgram('chromium') ?? 'chromium',
    args: ['--no-sandbox', '--disable-background-networking', '--disable-component-update', '--disable-sync', '--no-first-run'],
  });
}, 90_000);
afterAll(async () => {
  await browser.close();
  site.close();
  await world.stop();
});

/** A browser profile of one person. */
async function profileOf(people: SheetPeople, actor: PersonActor): Promise<BrowserContext> {
  const context = await browser.newContext();
  await context.exposeFunction('ticketFor', async (circuitId: string) => {
    const issued = offline ? undefined : await issueRoomTicket(world.db, circuitId, actor);
    return issued ? { ticket: issued.ticket, url: world.url(people.circuitId) } : null;
  });
  return context;
}

async function openPage(context: BrowserContext, people: SheetPeople, actor: PersonActor): Promise<Page> {
  const page = await context.newPage();
  await page.goto(siteUrl);
  await load(page, people, actor);
  return page;
}

async function load(page: Page, people: SheetPeople, actor: PersonActor): Promise<void> {
  await page.addScriptTag({ content: script });
  await page.evaluate(([circuitId, personId]) => window.sheet.open(circuitId, personId), [people.circuitId, actor.personId] as const);
}

const state = (page: Page) => page.evaluate(() => window.sheet.state());
type State = Awaited<ReturnType<typeof state>>;

async function until(page: Page, what: string, holds: (now: State) => boolean): Promise<State> {
  return waitFor(what, async () => {
    const now = await state(page);
    return holds(now) && now;
  }, 15_000).catch(async (error: Error) => {
    throw new Error(`${error.message} ${JSON.stringify(await state(page))}`);
  });
}

it('edits made offline survive a reload and go out once, and a tab that is open keeps its own', async () => {
  const people = await world.freshPeople();
  const context = await profileOf(people, people.maker);
  const page = await openPage(context, people, people.maker);
  await until(page, 'the sheet', ({ loaded, editable }) => loaded && editable);
  await page.evaluate(() => window.sheet.add('R1'));
  await until(page, 'R1 to be saved', ({ save, seq }) => save.state === 'saved' && seq === 1);

  offline = true;
  for (const connection of world.realtime.connections.all()) connection.close('ourFault');
  await until(page, 'the line to be gone', ({ line }) => line.state === 'connecting');
  await page.evaluate(() => window.sheet.add('R2'));
  await page.evaluate(() => window.sheet.add('R3'));
  expect((await state(page)).save).toMatchObject({ state: 'not saved', edits: 2 });

  // Another tab of the same person takes nothing from one that is still open.
  const tab = await openPage(context, people, people.maker);
  await until(tab, 'the tab to have begun', ({ line }) => line.state === 'connecting');
  expect((await state(tab)).save).toMatchObject({ state: 'saved' });
  await tab.close();

  await page.reload();
  await load(page, people, people.maker);
  await until(page, 'the kept edits', ({ save }) => save.state === 'not saved' && save.edits === 2);
  offline = false;
  const { refs } = await until(page, 'all to be saved', ({ save, loaded, seq }) => save.state === 'saved' && loaded && seq === 3);
  expect(refs).toEqual(['R1', 'R2', 'R3']);

  await page.reload();
  await load(page, people, people.maker);
  const again = await until(page, 'the sheet', ({ loaded, editable }) => loaded && editable);
  expect(again).toMatchObject({ refs: ['R1', 'R2', 'R3'], save: { state: 'saved' }, seq: 3, keptInMemoryOnly: false });
  await context.close();
}, 60_000);

it('a refused edit is still listed after a reload, and only to its author', async () => {
  const people = await world.freshPeople();
  const context = await profileOf(people, people.maker);
  const page = await openPage(context, people, people.maker);
  await until(page, 'the sheet', ({ loaded, editable }) => loaded && editable);
  await page.evaluate(() => window.sheet.spoil());
  await until(page, 'the refusal', ({ refused, editable }) => refused.length === 1 && editable);
  await page.reload();
  await load(page, people, people.maker);
  expect((await until(page, 'the sheet', ({ loaded }) => loaded)).refused).toEqual(['schema']);
  await page.reload();
  await page.addScriptTag({ content: script });
  await page.evaluate(([circuitId, personId]) => window.sheet.open(circuitId, personId), [people.circuitId, people.coMaker.personId] as const);
  expect((await until(page, 'the sheet', ({ loaded }) => loaded)).refused).toEqual([]);
  await context.close();
}, 60_000);
