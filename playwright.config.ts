import { existsSync } from 'node:fs';
import { defineConfig } from '@playwright/test';

/** Debian's browser; a browser of Playwright's own is never downloaded. */
const chromium = ['/usr/bin/chromium', '/usr/bin/chromium-browser'].find((file) => existsSync(file));

/** Run by `npm run test:browser`, which starts the product and hands over its address. */
export default defineConfig({
  testDir: 'tests/e2e',
  outputDir: 'test-results',
  fullyParallel: false,
  workers: 1,
  retries: 0,
  forbidOnly: Boolean(process.env['CI']),
  timeout: 180_000,
  expect: { timeout: 30_000 },
  reporter: process.env['PLAYWRIGHT_JSON_OUTPUT_FILE'] ? [['list'], ['json']] : [['list']],
  use: {
    actionTimeout: 30_000,
    baseURL: process.env['E2E_ADDRESS'] ?? 'http://127.0.0.1:3000',
    viewport: { width: 1440, height: 900 },
    contextOptions: { reducedMotion: 'reduce' },
    trace: 'retain-on-failure',
    screenshot: 'only-on-failure',
    launchOptions: {
      executablePath: chromium,
      args: ['--no-sandbox', '--disable-background-networking', '--disable-component-update', '--disable-sync', '--no-first-run'],
    },
  },
});
