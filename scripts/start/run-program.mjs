import path from 'node:path';
import { existsSync } from 'node:fs';
import { runCommand } from '../machine/run-command.mjs';

/**
 * Runs one of `scripts/programs` to its end: from the build, or from its source when there is none.
 * @param {{ root: string, build: string | undefined, name: string, env: NodeJS.ProcessEnv, args?: readonly string[] }} input
 */
export async function runProgram({ root, build, name, env, args = [] }) {
  const bundled = build && path.join(root, build, 'programs', `${name}.mjs`);
  const program = bundled && existsSync(bundled) ? [bundled] : ['--import', 'tsx', path.join(root, 'scripts/programs', `${name}.ts`)];
  return runCommand(process.execPath, [...program, ...args], { quiet: true, cwd: root, env });
}
