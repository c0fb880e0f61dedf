import { readFileSync } from 'node:fs';
import path from 'node:path';
import { runCommand } from '../machine/run-command.mjs';
import { Refusal, step, words } from '../machine/say.mjs';

/** Installs the packages when they are missing or the lock file names others. @param {string} root */
export async function preparePackages(root) {
  if (packagesMatch(root)) return;
  step('Installing packages (npm ci; a minute or two)');
  try {
    await runCommand('npm', ['ci', '--include=dev', '--no-audit', '--no-fund'], { quiet: true, cwd: root });
  } catch (error) {
    throw new Refusal(`The packages could not be installed.\n${words(error)}`);
  }
}

/** Compares what npm noted in node_modules with the lock file; optional packages of other machines may be missing. @param {string} root */
export function packagesMatch(root) {
  const wanted = packagesOf(path.join(root, 'package-lock.json'));
  const there = packagesOf(path.join(root, 'node_modules/.package-lock.json'));
  if (!wanted || !there) return false;
  const mine = (/** @type {string} */ name) => name !== '';
  return Object.keys(wanted).filter(mine).every((name) => there[name]?.version === wanted[name]?.version || (!there[name] && wanted[name]?.optional))
    && Object.keys(there).filter(mine).every((name) => wanted[name]);
}

/** @param {string} file @returns {Record<string, { version?: string, optional?: boolean }> | undefined} */
function packagesOf(file) {
  try {
    return JSON.parse(readFileSync(file, 'utf8')).packages;
  } catch {
    return undefined;
  }
}
