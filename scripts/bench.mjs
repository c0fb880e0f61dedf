/**
 * `npm run bench`: the figures of README's claims, medians and 95th percentiles, measured side by side in one run on this
 * machine. Names of benches may be given. Ends with 1 when a target is missed.
 */
import { spawn } from 'node:child_process';
import { readdirSync } from 'node:fs';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { ensurePrograms } from './machine/debian-packages.mjs';
import { say, step } from './machine/say.mjs';
import { preparePackages } from './start/prepare-packages.mjs';

const root = fileURLToPath(new URL('..', import.meta.url));
const all = readdirSync(path.join(root, 'tests/bench')).filter((name) => name.endsWith('.ts')).map((name) => name.replace(/\.ts$/, '')).sort();
const wanted = process.argv.slice(2);
await preparePackages(root);
await ensurePrograms({ mariadbd: 'mariadb-server', ngspice: 'ngspice', chromium: 'chromium' });

/** @type {{ what: string, median: number, p95: number, n: number, unit: string, target?: string, met?: boolean }[]} */
const figures = [];
let broken = 0;
for (const name of all.filter((one) => wanted.length === 0 || wanted.includes(one))) {
  step(name);
  const { code, lines } = await run(['--import', 'tsx', path.join(root, 'tests/bench', `${name}.ts`)]);
  if (code !== 0) broken += 1;
  figures.push(...lines.filter((line) => line.startsWith('{')).map((line) => JSON.parse(line)));
}

const shown = (/** @type {number} */ value) => (value >= 100 ? value.toFixed(0) : value.toPrecision(3));
say('');
say('| what | median | 95 % | n | target |');
say('| --- | --- | --- | --- | --- |');
for (const { what, median, p95, n, unit, target, met } of figures) {
  const verdict = target ? `${target} ${met ? 'met' : 'MISSED'}` : '';
  say(`| ${what} | ${shown(median)} ${unit} | ${n > 1 ? `${shown(p95)} ${unit}` : ''} | ${n} | ${verdict} |`);
}
process.exit(broken > 0 || figures.some(({ met }) => met === false) ? 1 : 0);

/** @param {readonly string[]} args @returns {Promise<{ code: number, lines: string[] }>} */
function run(args) {
  return new Promise((resolve) => {
    const child = spawn(process.execPath, [...args], { cwd: root, stdio: ['ignore', 'pipe', 'inherit'], env: { ...process.env, NEXT_TELEMETRY_DISABLED: '1' } });
    let output = '';
    child.stdout.on('data', (bytes) => { output += bytes; });
    child.once('close', (code) => resolve({ code: code ?? 1, lines: output.split('\n') }));
  });
}
