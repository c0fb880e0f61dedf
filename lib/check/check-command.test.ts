import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterAll, expect, test, vi } from 'vitest';
import { checkCommand } from './check-command';
import type { FileReport } from './check-file';

// The engine takes seconds to start on a busy machine.
vi.setConfig({ testTimeout: 60_000 });

const folder = mkdtempSync(path.join(tmpdir(), 'check-'));
afterAll(() => rmSync(folder, { recursive: true }));

function deckFile(name: string, lines: string): string {
  const file = path.join(folder, name);
  writeFileSync(file, lines);
  return file;
}

async function run(...args: readonly string[]): Promise<{ readonly code: number; readonly out: string; readonly err: string }> {
  let [out, err] = ['', ''];
  const code = await checkCommand(args, { out: (text) => { out += text; }, err: (text) => { err += text; } });
  return { code, out, err };
}

const right = deckFile('right.cir', 'Indicator\nV1 vbus 0 12\n*@V1 role=supply\nR1 vbus a 1k\n*@R1 pmax=0.25\nD1 a 0 DL\n*@D1 kind=LED vf=2 if_max=20m\n.model DL D(IS=1e-20 N=2)\n.op\n.end\n');
const stopped = deckFile('stopped.cir', 'Indicator\nV1 vbus 0 60\n*@V1 role=supply\nR1 vbus a 1k\n*@R1 pmax=0.25\nD1 a 0 DL\n*@D1 kind=LED vf=2 if_max=20m\n.model DL D(IS=1e-20 N=2)\n.end\n');
const unreadable = deckFile('unreadable.cir', 'Broken\nV1 vbus 0 12\nR1 vbus 0 4k7x9\n.end\n');
const boxed = deckFile('boxed.cir', 'Boxed\nV1 a 0 5\nE1 b 0 a 0 2\nR1 b 0 1k\n.end\n');
const floating = deckFile('floating.cir', 'Floating\nV1 a 0 5\nC1 a b 1n\nC2 b 0 1n\nR1 a 0 1k\n.end\n');

test('exit 0 without a stop, 1 with one, and 2 wins', async () => {
  expect((await run(right, '--json')).code).toBe(0);
  expect((await run(right, stopped, '--json')).code).toBe(1);
  expect((await run(stopped, unreadable, '--json')).code).toBe(2);
  expect((await run(path.join(folder, 'nowhere.cir'), '--json')).code).toBe(2);
});

test('one object for each file, each on its line, also for what cannot be read', async () => {
  const { out, err } = await run(right, unreadable, stopped, '--json');
  const reports = out.trimEnd().split('\n').map((line) => JSON.parse(line) as FileReport);
  expect(reports.map(({ file }) => file)).toEqual([right, unreadable, stopped]);
  expect(Object.keys(reports[0]!).sort()).toEqual(['errors', 'file', 'findings', 'notices', 'op', 'undetermined']);
  expect(reports[1]).toMatchObject({ findings: [], undetermined: [], notices: [], op: {}, errors: [{ line: 3 }] });
  expect(err).toContain(`${unreadable}:3: `);
  expect(reports[2]!.findings.map(({ rule }) => rule)).toContain('led-resistor-undersized');
  expect(reports[0]!.notices).toMatchObject([{ line: 9 }]);
});

test('node volts as drawn, in lower case and without node 0', async () => {
  const [report] = (await run(right, '--json')).out.trimEnd().split('\n').map((line) => JSON.parse(line) as FileReport);
  expect(Object.keys(report!.op['as drawn']!).sort()).toEqual(['a', 'vbus']);
  expect(report!.op['as drawn']!.vbus).toBeCloseTo(12, 9);
});

test('a boxed element leaves no numbers, a floating node says why; neither is a file that cannot be read', async () => {
  const { out, code } = await run(boxed, floating, '--json');
  const [box, float] = out.trimEnd().split('\n').map((line) => JSON.parse(line) as FileReport);
  expect(box!.op).toEqual({});
  expect(float!.op['as drawn']).toBeUndefined();
  expect(float!.errors.length).toBeGreaterThan(0);
  expect(code).toBe(0);
});

test('for people: grouped by severity, plain text', async () => {
  const { out } = await run(stopped);
  expect(out).toMatch(/^Stop \(\d\)$/m);
  expect(out.replaceAll('\u2009', ' ')).toMatch(/R1 lets 5\d(\.\d)? mA through D1/);
  expect(out).not.toContain('\u001b');
});

test('without a file it says how it is used', async () => {
  expect(await run('--json')).toMatchObject({ code: 2, out: '', err: expect.stringContaining('Usage') as string });
  expect(await run('--jsn', right)).toMatchObject({ code: 2, err: expect.stringContaining('--jsn') as string });
});
