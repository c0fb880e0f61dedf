import { readFileSync } from 'node:fs';
import { createServer, type Server } from 'node:http';
import type { AddressInfo } from 'node:net';
import path from 'node:path';
import { build } from 'esbuild';
import { chromium, type Browser, type Page } from '@playwright/test';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import type { SimulationResult } from '@/lib/spice/engine';
import { engineHeaders } from '../../scripts/build/response-headers.mjs';
import { vendorEngine } from '../../scripts/build/vendor-engine.mjs';

/** The page's own policy allows scripts and workers of this site only, as the product's does. */
const pagePolicy = "default-src 'none'; script-src 'self'; worker-src 'self'; connect-src 'self'";

let server: Server;
let browser: Browser;
let page: Page;

beforeAll(async () => {
  vendorEngine(process.cwd());
  const bundle = await build({
    stdin: {
      contents: "import { createBrowserEngine } from './lib/spice/browser-engine'; globalThis.engine = createBrowserEngine();",
      resolveDir: process.cwd(),
    },
    bundle: true, write: false, format: 'esm',
  });
  server = createServer((request, response) => {
    const { pathname } = new URL(request.url ?? '/', 'http://localhost');
    if (pathname.startsWith('/vendor/')) {
      for (const { key, value } of engineHeaders) response.setHeader(key, value);
      response.setHeader('Content-Type', 'text/javascript');
      response.end(readFileSync(path.join('public', path.normalize(pathname))));
      return;
    }
    response.setHeader('Content-Security-Policy', pagePolicy);
    response.setHeader('Content-Type', pathname === '/page.js' ? 'text/javascript' : 'text/html');
    response.end(pathname === '/page.js' ? bundle.outputFiles[0]?.contents : '<script type="module" src="/page.js"></script>');
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  browser = await chromium.launch({
    executablePath: '/usr/bin/chromium',
    args: ['--no-sandbox', '--disable-background-networking', '--disable-component-update', '--disable-sync', '--no-first-run'],
  });
  page = await browser.newPage();
  await page.goto(`http://127.0.0.1:${(server.address() as AddressInfo).port}/`);
});

afterAll(async () => {
  await browser?.close();
  server?.close();
});

function simulate(lines: readonly string[]): Promise<SimulationResult> {
  return page.evaluate(
    (deck) => (globalThis as unknown as { engine: { simulate(request: object): Promise<SimulationResult> } }).engine
      .simulate({ lines: deck, analysis: 'op', vectors: ['v(b)'] }),
    lines,
  );
}

describe('the engine in a browser worker, under its own content security policy', () => {
  it('runs a deck', async () => {
    expect(await simulate(['V1 a 0 12', 'R1 a b 1k', 'R2 b 0 2k', '.op'])).toEqual({ status: 'ok', values: { 'v(b)': 8 } });
  });

  it('refuses a floating node and a fatal end, and is right after both', async () => {
    expect((await simulate(['V1 a 0 12', 'R1 a 0 1k', 'C1 b 0 1u', '.op'])).status).toBe('singular');
    expect((await simulate(['V1 a 0 12', 'D1 a b DX', 'R1 b 0 1k', '.model DX D(FOO=3)', '.op'])).status).toBe('fatal');
    expect(await simulate(['V1 a 0 3', 'R1 a b 1k', 'R2 b 0 2k', '.op'])).toEqual({ status: 'ok', values: { 'v(b)': 2 } });
  });
});
