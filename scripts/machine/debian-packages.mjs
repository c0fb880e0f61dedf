import { existsSync } from 'node:fs';
import path from 'node:path';
import { runCommand } from './run-command.mjs';
import { Refusal, step } from './say.mjs';

const folders = [...(process.env.PATH ?? '').split(path.delimiter), '/usr/sbin', '/usr/local/sbin', '/sbin'];

/** Full path of a program, or undefined. Debian keeps servers in folders that a plain account's PATH lacks. @param {string} name */
export function findProgram(name) {
  return folders.filter(Boolean).map((folder) => path.join(folder, name)).find((file) => existsSync(file));
}

/**
 * Makes sure that programs are there, by Debian's packages.
 * @param {Readonly<Record<string, string>>} wanted program → package
 */
export async function ensurePrograms(wanted) {
  const packages = [...new Set(Object.entries(wanted).filter(([program]) => !findProgram(program)).map(([, name]) => name))];
  if (packages.length === 0) return;
  const install = ['apt-get', 'install', '-y', '--no-install-recommends', ...packages];
  const byHand = `sudo apt-get update && sudo ${install.join(' ')}`;
  if (!findProgram('apt-get')) throw new Refusal(`${packages.join(', ')} missing, and this is not Debian. Install it, then start again.`);
  const prefix = await elevation();
  if (!prefix) throw new Refusal(`${packages.join(', ')} missing, and this account may not install it. Run this once, then start again:\n\n  ${byHand}\n`);
  step(`Installing ${packages.join(', ')} (Debian packages)`);
  const [command = '', ...rest] = prefix;
  const env = { ...process.env, DEBIAN_FRONTEND: 'noninteractive' };
  try {
    await runCommand(command, [...rest, 'apt-get', 'update', '-q'], { quiet: true, env });
    await runCommand(command, [...rest, ...install], { quiet: true, env });
  } catch (error) {
    throw new Refusal(`${error instanceof Error ? error.message : error}\nRun this yourself, then start again:\n\n  ${byHand}\n`);
  }
}

/** What to put before apt-get, or undefined when nothing works without asking for a password. */
async function elevation() {
  if (process.getuid?.() === 0) return ['env', 'DEBIAN_FRONTEND=noninteractive'];
  if (!findProgram('sudo')) return undefined;
  try {
    await runCommand('sudo', ['-n', 'true'], { quiet: true });
    return ['sudo', '-n', 'env', 'DEBIAN_FRONTEND=noninteractive'];
  } catch {
    return undefined;
  }
}
