import { mkdtempSync, readFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterAll, beforeAll, expect, it } from 'vitest';
import { anyFreePort } from '../../scripts/machine/free-port.mjs';
import { waitUntil } from '../../scripts/machine/wait-until.mjs';
import { startProduct } from '../../scripts/test/started-product.mjs';
import { SignedInPerson } from '../support/signed-in-person';
import { SteadyEditor } from './support/steady-editor';

type Product = Awaited<ReturnType<typeof startProduct>>;

const dataFolder = path.join(mkdtempSync(path.join(tmpdir(), 'holdoff-kill-')), 'data');
let env: Record<string, string>;
let product: Product;

beforeAll(async () => {
  env = { PORT: String(await anyFreePort()), REALTIME_PORT: String(await anyFreePort()) };
  product = await startProduct({ root: process.cwd(), dataFolder, env });
});
afterAll(() => product.stop());

const lock = () => JSON.parse(readFileSync(path.join(dataFolder, 'lock.json'), 'utf8')) as { parts: { pid: number; name: string }[] };
const partPid = (name: string) => lock().parts.find((part) => part.name === name)?.pid ?? 0;
const healthy = async () => (await fetch(`${product.address}/api/health`)).status === 200;

/** What is killed, by a process number that this test's own product wrote down. */
const victims: readonly (readonly [string, () => Promise<void> | void])[] = [
  ['realtime', () => void process.kill(partPid('Realtime'), 'SIGKILL')],
  ['web', () => void process.kill(partPid('Web'), 'SIGKILL')],
  ['MariaDB', () => void process.kill(Number(readFileSync(path.join(dataFolder, 'run/mariadb.pid'), 'utf8')), 'SIGKILL')],
  ['the guardian of MariaDB', () => void process.kill(partPid('MariaDB'), 'SIGKILL')],
  ['the supervisor', async () => {
    product.signal('SIGKILL');
    await product.exited;
    product = await startProduct({ root: process.cwd(), dataFolder, env });
  }],
];

it('loses nothing that was acknowledged when any process is killed while people edit', async () => {
  const maker = await SignedInPerson.signIn(product.address, product.accounts.find(({ part }) => part === 'maker') ?? { email: '', password: '' });
  const { id } = await maker.call<{ id: string }>('POST', `/api/benches/${await maker.firstBench()}/circuits`, { title: 'Killed while it is drawn' });
  const editor = new SteadyEditor(maker, id);
  editor.start();
  for (const [name, kill] of victims) {
    const before = editor.acknowledged.size;
    expect(await waitUntil(() => editor.acknowledged.size >= before + 10, { timeoutMs: 60_000 }), `edits before ${name} is killed`).toBe(true);
    await kill();
    expect(await waitUntil(healthy, { timeoutMs: 120_000 }), `health after ${name} was killed`).toBe(true);
    const after = editor.acknowledged.size;
    expect(await waitUntil(() => editor.acknowledged.size > after, { timeoutMs: 60_000 }), `edits after ${name} was killed`).toBe(true);
  }
  await editor.finish();

  const netlist = await maker.call<{ parts: { ref: string }[] }>('GET', `/api/circuits/${id}/netlist`);
  const stored = netlist.parts.map(({ ref }) => ref);
  expect([...editor.acknowledged].filter((ref) => !stored.includes(ref))).toEqual([]);
  expect(new Set(stored).size).toBe(stored.length);
}, 900_000);
