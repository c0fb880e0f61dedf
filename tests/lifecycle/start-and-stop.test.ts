import { mkdtempSync, readFileSync } from 'node:fs';
import { createServer } from 'node:http';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { isAlive } from '../../scripts/machine/processes.mjs';
import { waitUntil } from '../../scripts/machine/wait-until.mjs';
import { startProduct } from '../../scripts/test/started-product.mjs';

type Product = Awaited<ReturnType<typeof startProduct>>;

const root = process.cwd();
const freshFolder = () => path.join(mkdtempSync(path.join(tmpdir(), 'holdoff-life-')), 'data');
const partsOf = (product: Product): readonly number[] => {
  const lock = JSON.parse(readFileSync(path.join(product.dataFolder, 'lock.json'), 'utf8')) as { parts: { pid: number }[] };
  return lock.parts.map((part) => part.pid);
};
const answers = async (product: Product) => (await fetch(`${product.address}/api/health`)).status === 200;

describe('npm start', () => {
  let product: Product;
  beforeAll(async () => { product = await startProduct({ root, dataFolder: freshFolder() }); });
  afterAll(() => product.stop());

  it('answers at the address it prints, in plain text', async () => {
    expect(await answers(product)).toBe(true);
    expect(product.output()).not.toContain('\u001b');
  });

  it('prints one line for each demo account, the maker first, and names nobody elsewhere', () => {
    const named = product.output().split('\n').filter((line) => line.includes('@'));
    expect(named.length).toBeGreaterThanOrEqual(4);
    for (const line of named) expect(line).toMatch(/^\S+@\S+ {2}[A-Za-z0-9]{10,} {2}(maker|reviewer|mentor|steward|member)$/);
    expect(named[0]).toMatch(/ {2}maker$/);
    expect(new Set(product.accounts.map(({ part }) => part))).toEqual(new Set(['maker', 'reviewer', 'mentor', 'steward', 'member']));
    expect(new Set(product.accounts.map(({ password }) => password)).size).toBe(product.accounts.length);
  });

  it('lets every demo account in, into one shared bench, in its role', async () => {
    const roles: Record<string, string> = { maker: 'member', reviewer: 'member', member: 'member', mentor: 'mentor', steward: 'steward' };
    const benches = new Set<string>();
    for (const { email, password, part } of product.accounts) {
      const signedIn = await fetch(`${product.address}/api/session`, {
        method: 'POST', headers: { 'content-type': 'application/json', origin: product.address, 'sec-fetch-site': 'same-origin' }, body: JSON.stringify({ email, password }),
      });
      expect(signedIn.status, part).toBeLessThan(300);
      const cookie = (signedIn.headers.get('set-cookie') ?? '').split(';')[0] ?? '';
      const who = await (await fetch(`${product.address}/api/session`, { headers: { cookie } })).json() as { benches: { slug: string; role: string }[] };
      expect(who.benches[0]?.role, part).toBe(roles[part]);
      benches.add(who.benches[0]?.slug ?? '');
    }
    expect(benches.size).toBe(1);
  });

  it('says that it is running already, and where', async () => {
    await expect(startProduct({ root, dataFolder: product.dataFolder })).rejects.toThrow(`Already running at ${product.address}`);
  });

  it('says that a port is taken, and ends', async () => {
    const other = createServer();
    const port = await new Promise<number>((resolve) => { other.listen(0, '127.0.0.1', () => resolve((other.address() as { port: number }).port)); });
    try {
      await expect(startProduct({ root, dataFolder: freshFolder(), env: { PORT: String(port) } })).rejects.toThrow(`Port ${port} (PORT) is taken`);
    } finally {
      other.close();
    }
  });

  it('starts a part again that was killed', async () => {
    for (const index of [0, 1, 2, 3]) {
      const before = partsOf(product);
      process.kill(before[index] ?? 0, 'SIGKILL');
      expect(await waitUntil(() => !partsOf(product).includes(before[index] ?? 0), { timeoutMs: 60_000 })).toBe(true);
      expect(await waitUntil(() => answers(product), { timeoutMs: 60_000 })).toBe(true);
    }
  });

  it('takes two signals within a second as one, and leaves nothing behind', async () => {
    const parts = partsOf(product);
    const started = Date.now();
    product.signal('SIGINT');
    product.signal('SIGINT');
    expect(await product.exited).toBe(0);
    expect(Date.now() - started).toBeLessThan(30_000);
    expect(parts.filter(isAlive)).toEqual([]);
  });
});

describe('after a kill -9 of the supervisor', () => {
  it('the parts end by themselves, and the next start serves the same accounts', async () => {
    const dataFolder = freshFolder();
    const first = await startProduct({ root, dataFolder });
    const parts = partsOf(first);
    first.signal('SIGKILL');
    await first.exited;
    expect(await waitUntil(() => !parts.some(isAlive), { timeoutMs: 60_000 })).toBe(true);
    const second = await startProduct({ root, dataFolder });
    try {
      expect(second.accounts).toEqual(first.accounts);
      expect(await answers(second)).toBe(true);
    } finally {
      await second.stop();
    }
  });

  it('a MariaDB that was left behind is taken over', async () => {
    const dataFolder = freshFolder();
    const first = await startProduct({ root, dataFolder });
    const [guardian = 0] = partsOf(first);
    const server = Number(readFileSync(path.join(dataFolder, 'run/mariadb.pid'), 'utf8'));
    first.signal('SIGKILL');
    process.kill(guardian, 'SIGKILL');
    await first.exited;
    const second = await startProduct({ root, dataFolder });
    expect(isAlive(server)).toBe(false);
    expect(await answers(second)).toBe(true);
    await second.stop();
  });
});

describe('on a public address', () => {
  it('has no demo people, asks for mail and files, and names the command for the first steward', async () => {
    const product = await startProduct({ root, dataFolder: freshFolder(), env: { PUBLIC_URL: 'https://bench.example.org' } });
    try {
      expect(product.accounts).toEqual([]);
      expect(product.output()).toMatch(/SMTP_URL[^]*S3_ENDPOINT[^]*first-steward/);
      expect(product.output()).not.toMatch(/northgate/);
    } finally {
      await product.stop();
    }
  });
});
