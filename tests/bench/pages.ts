import { existsSync, mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { gzipSync } from 'node:zlib';
import { chromium, type BrowserContext, type Page } from '@playwright/test';
import { writeDeck } from '@/lib/netlist/deck/write-deck';
import { sheetToNetlist } from '@/lib/document/nets/sheet-to-netlist';
import { anyFreePort } from '../../scripts/machine/free-port.mjs';
import { startProduct } from '../../scripts/test/started-product.mjs';
import { SignedInPerson } from '../support/signed-in-person';
import { figure, quantile, report } from './support/figures';
import { manyStages } from './support/many-stages';

/**
 * What a page weighs (JavaScript it loads by itself, gzip, without the engine) and how a sheet drags: frames while one part is
 * moved, 300 parts with at most 60 in view beside 30 parts.
 */
const kilo = 1_000;
const folder = mkdtempSync(path.join(tmpdir(), 'holdoff-pages-'));
const product = await startProduct({ root: process.cwd(), dataFolder: path.join(folder, 'data'), env: { PORT: String(await anyFreePort()) } });
const account = product.accounts.find(({ part }) => part === 'maker');
if (!account) throw new Error('No demo maker.');
const maker = await SignedInPerson.signIn(product.address, account);
const bench = await maker.firstBench();
const browser = await chromium.launch({
  executablePath: ['/usr/bin/chromium', '/usr/bin/chromium-browser'].find((file) => existsSync(file)),
  args: ['--no-sandbox', '--disable-background-networking', '--disable-component-update', '--disable-sync', '--no-first-run'],
});

async function newContext(): Promise<BrowserContext> {
  const context = await browser.newContext({ baseURL: product.address, viewport: { width: 1440, height: 900 }, reducedMotion: 'reduce' });
  await context.request.post('/api/session', { data: { email: account?.email, password: account?.password }, headers: { origin: product.address, 'sec-fetch-site': 'same-origin' } });
  return context;
}

/** Bytes of the scripts of a page, each compressed as it is served. */
async function weight(address: string, settled: (page: Page) => Promise<void>): Promise<number> {
  const context = await newContext();
  const page = await context.newPage();
  const bodies: Promise<Buffer>[] = [];
  page.on('response', (response) => {
    if (response.request().resourceType() === 'script' && !response.url().includes('/vendor/')) bodies.push(response.body());
  });
  await page.goto(address);
  await settled(page);
  const sizes = (await Promise.all(bodies)).map((body) => gzipSync(body).length);
  await context.close();
  return sizes.reduce((sum, size) => sum + size, 0) / kilo;
}

const checked = (page: Page) => page.getByRole('complementary', { name: 'Margin' }).getByText(/\d+ checks on/).waitFor({ timeout: 90_000 });

async function post(parts: number): Promise<string> {
  const deck = writeDeck(sheetToNetlist(manyStages(parts)));
  const { id } = await maker.call<{ id: string }>('POST', `/api/benches/${bench}/circuits`, { title: `${parts} parts`, deck });
  return `/circuits/${id}`;
}

/** Text, not a function: the loader that runs this file adds names that a page does not know. */
const noteFrames = `
  globalThis.holdoffFrames = [];
  requestAnimationFrame(function note(at) { globalThis.holdoffFrames.push(at); requestAnimationFrame(note); });
`;

/** Frames a second while one part is dragged to and fro, zoomed until at most `inView` parts are rendered. */
async function dragRate(address: string, inView: number): Promise<number[]> {
  const context = await newContext();
  const page = await context.newPage();
  await page.goto(address);
  await checked(page);
  const parts = page.locator('[aria-roledescription="part"]');
  for (let zoom = 0; zoom < 30 && (await parts.count()) > inView; zoom += 1) await page.getByRole('button', { name: 'Zoom in' }).click();
  const canvas = await page.locator('.react-flow__pane').boundingBox();
  const boxes = (await Promise.all((await parts.all()).map((part) => part.boundingBox()))).filter((box) => box !== null);
  const target = boxes.find((box) => canvas && box.x > canvas.x + 150 && box.y > canvas.y + 150 && box.x < canvas.x + canvas.width - 250 && box.y < canvas.y + canvas.height - 250);
  if (!target) throw new Error('No part is where it can be dragged.');
  const [x, y] = [target.x + target.width / 2, target.y + target.height / 2];
  await page.evaluate(noteFrames);
  await page.mouse.move(x, y);
  await page.mouse.down();
  for (let step = 1; step <= 120; step += 1) await page.mouse.move(x + 60 * Math.sin(step / 8), y + 40 * Math.sin(step / 11));
  await page.mouse.up();
  const frames = await page.evaluate<number[]>('globalThis.holdoffFrames');
  await context.close();
  // Over twenty frames: single frames fall on the display's own beat whatever the load.
  return frames.slice(20).map((at, index) => 20_000 / (at - (frames[index] ?? at))).filter((_, index) => index % 20 === 0);
}

try {
  const landing = await weight('/', (page) => page.waitForLoadState('networkidle'));
  const demo = (await maker.call<{ items: { id: string }[] }>('GET', `/api/benches/${bench}/circuits`)).items[0]?.id ?? '';
  const sheet = await weight(`/circuits/${demo}`, checked);
  const [few, many] = [await dragRate(await post(30), 60), await dragRate(await post(300), 60)];
  report([
    figure('JavaScript of the landing page, gzip', [landing], 'kB', { atMost: 120 }),
    figure('JavaScript of the sheet page, gzip, without the engine', [sheet], 'kB', { atMost: 350 }),
    figure('frames while dragging, 30 parts', few, 'fps'),
    figure('frames while dragging, 300 parts, at most 60 in view', many, 'fps'),
    figure('ratio of median frame rates, 300 to 30 parts', [quantile(many, 0.5) / quantile(few, 0.5)], '×', { atLeast: 0.8 }),
  ]);
} finally {
  await browser.close();
  await product.stop();
  rmSync(folder, { recursive: true, force: true });
}
