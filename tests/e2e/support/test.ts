import { AxeBuilder } from '@axe-core/playwright';
import { test as base, expect, type BrowserContext, type Page } from '@playwright/test';

export type DemoPart = 'maker' | 'reviewer' | 'mentor' | 'steward' | 'member';
interface Account {
  readonly email: string;
  readonly password: string;
  readonly part: DemoPart;
}

/** The demo accounts as `npm start` printed them. */
const accounts = JSON.parse(process.env['E2E_ACCOUNTS'] ?? '[]') as readonly Account[];

export function account(part: DemoPart): Account {
  const found = accounts.find((one) => one.part === part);
  if (!found) throw new Error(`No demo account of a ${part}: run the browser tests with \`npm run test:browser\`.`);
  return found;
}

export interface Visit {
  readonly page: Page;
  readonly context: BrowserContext;
}

interface Fixtures {
  /** Opens a browser of its own for one of the demo people, signed in; each call is another browser. */
  readonly signedIn: (part: DemoPart, options?: { readonly phone?: boolean; readonly night?: boolean }) => Promise<Visit>;
  /** A browser of somebody who is not signed in. */
  readonly stranger: (options?: { readonly phone?: boolean; readonly night?: boolean }) => Promise<Visit>;
  /** Console errors and page errors of every browser of the test; the test fails when any is left. */
  readonly complaints: string[];
  /** What the test expects the browser itself to report, such as a refused request. */
  readonly forgiven: RegExp[];
}

const phone = { viewport: { width: 390, height: 844 }, hasTouch: true, isMobile: true } as const;

export const test = base.extend<Fixtures>({
  forgiven: async ({}, provide) => { await provide([]); },

  complaints: [async ({ forgiven }, provide) => {
    const complaints: string[] = [];
    await provide(complaints);
    expect(complaints.filter((line) => !forgiven.some((one) => one.test(line))), 'errors in the console').toEqual([]);
  }, { auto: true }],

  stranger: async ({ browser, complaints, baseURL }, provide) => {
    const open: BrowserContext[] = [];
    await provide(async (options = {}) => {
      const context = await browser.newContext({
        baseURL, reducedMotion: 'reduce', colorScheme: options.night ? 'dark' : 'light', ...(options.phone ? phone : { viewport: { width: 1440, height: 900 } }),
      });
      open.push(context);
      const page = await context.newPage();
      page.on('console', (message) => { if (message.type() === 'error') complaints.push(`${page.url()}: ${message.text()}`); });
      page.on('pageerror', (error) => complaints.push(`${page.url()}: ${error.message}`));
      return { page, context };
    });
    await Promise.all(open.map((context) => context.close()));
  },

  signedIn: async ({ stranger, baseURL }, provide) => {
    await provide(async (part, options) => {
      const visit = await stranger(options);
      const { email, password } = account(part);
      const answer = await visit.context.request.post('/api/session', {
        data: { email, password }, headers: { origin: new URL(baseURL ?? '').origin, 'sec-fetch-site': 'same-origin' },
      });
      expect(answer.ok(), `sign-in of the ${part}`).toBe(true);
      return visit;
    });
  },
});

/** No violation of WCAG 2.2 A and AA or of axe's best practices. */
export async function expectNoAxeViolations(page: Page): Promise<void> {
  const { violations } = await new AxeBuilder({ page }).analyze();
  expect(violations.map(({ id, nodes }) => `${id}: ${nodes.map((node) => node.target.join(' ')).join(', ')}`)).toEqual([]);
}

export { expect };
