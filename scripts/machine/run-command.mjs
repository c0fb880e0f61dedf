import { spawn } from 'node:child_process';
import { interruption } from './interruption.mjs';

/**
 * Runs a program to its end; it is ended when this process is told to end.
 * @param {string} command
 * @param {readonly string[]} args
 * @param {import('node:child_process').SpawnOptions & { quiet?: boolean }} [options] `quiet` keeps its output for the error only
 * @returns {Promise<string>} standard output when quiet, else ''. Rejects with the last lines when it ends with another code than 0.
 */
export function runCommand(command, args, { quiet = false, env = process.env, ...options } = {}) {
  return new Promise((resolve, reject) => {
    const child = spawn(command, args, { stdio: quiet ? ['ignore', 'pipe', 'pipe'] : ['ignore', 'inherit', 'inherit'], signal: interruption.signal, ...options, env: quiet ? { ...env, NO_COLOR: '1', FORCE_COLOR: '0' } : env });
    let output = '';
    let everything = '';
    child.stdout?.on('data', (bytes) => { output += bytes; everything += bytes; });
    child.stderr?.on('data', (bytes) => { everything += bytes; });
    child.once('error', reject);
    child.once('close', (code, signal) => {
      if (code === 0) return resolve(output);
      const tail = everything.trim().split('\n').slice(-20).join('\n');
      reject(new Error(`\`${command} ${args.slice(0, 3).join(' ')}\` ended with ${signal ?? `code ${code}`}${tail ? `:\n${tail}` : ''}`));
    });
  });
}
