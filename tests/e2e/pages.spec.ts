import type { Page } from '@playwright/test';
import { CircuitPage } from './support/circuit-page';
import { expect, expectNoAxeViolations, test, type DemoPart } from './support/test';

const demo = 'Induction-heater driver, low-voltage proof stage';

interface Screen {
  readonly name: string;
  readonly who: DemoPart | 'stranger';
  readonly open: (page: Page) => Promise<void>;
}

async function openSheet(page: Page): Promise<void> {
  await new CircuitPage(page).open(demo);
}

/** Every screen that is built, as the person who would see it. */
const screens: readonly Screen[] = [
  { name: 'landing', who: 'stranger', open: async (page) => { await page.goto('/'); } },
  { name: 'sign-in', who: 'stranger', open: async (page) => { await page.goto('/sign-in'); } },
  { name: 'a page that is not there', who: 'stranger', open: async (page) => { await page.goto('/nowhere'); } },
  { name: 'bench home', who: 'maker', open: async (page) => { await page.goto('/benches'); } },
  {
    name: 'post a circuit', who: 'maker', open: async (page) => {
      await page.goto('/benches');
      await page.goto(`${new URL(page.url()).pathname}/new`);
    },
  },
  { name: 'sheet', who: 'maker', open: openSheet },
  {
    name: 'revisions', who: 'mentor', open: async (page) => {
      await page.goto('/benches');
      const sheet = await page.getByRole('link', { name: demo }).first().getAttribute('href');
      await page.goto(`${sheet}/revisions`);
    },
  },
  { name: 'sessions', who: 'reviewer', open: async (page) => { await page.goto('/account/sessions'); } },
];

const looks = [
  { name: 'day, desk', options: {} }, { name: 'night, desk', options: { night: true } },
  { name: 'day, phone', options: { phone: true } }, { name: 'night, phone', options: { phone: true, night: true } },
] as const;

for (const { name, who, open } of screens) {
  for (const look of looks) {
    test(`${name}, ${look.name}: no axe violation, nothing wider than the screen, no error in the console`, async ({ stranger, signedIn, forgiven }) => {
      if (name === 'a page that is not there') forgiven.push(/status of 404/);
      const { page } = who === 'stranger' ? await stranger(look.options) : await signedIn(who, look.options);
      await open(page);
      await expect(page.getByRole('heading', { level: 1 })).toBeAttached();
      await expectNoAxeViolations(page);
      const overflow = await page.evaluate(() => document.documentElement.scrollWidth - document.documentElement.clientWidth);
      expect(overflow).toBeLessThanOrEqual(0);
    });
  }
}
