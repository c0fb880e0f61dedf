/**
 * Runs one program and ends it when this process is told to end or its parent's pipe (standard input) closes.
 * For programs that do not watch a pipe themselves: `node guardian.mjs PROGRAM ARGUMENTS…`.
 */
import { spawn } from 'node:child_process';

const graceMs = 20_000;
const [program = '', ...args] = process.argv.slice(2);
const child = spawn(program, args, { stdio: ['ignore', 'inherit', 'inherit'] });
let ending = false;

function end() {
  if (ending) return;
  ending = true;
  child.kill('SIGTERM');
  setTimeout(() => child.kill('SIGKILL'), graceMs).unref();
}

for (const signal of /** @type {const} */ (['SIGTERM', 'SIGINT', 'SIGHUP'])) process.on(signal, end);
process.stdin.on('end', end).on('close', end).on('error', end).resume();
child.once('error', (error) => {
  process.stderr.write(`${program}: ${error.message}\n`);
  process.exit(127);
});
child.once('exit', (code, signal) => process.exit(code ?? (signal && ending ? 0 : 1)));
