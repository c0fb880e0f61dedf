import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { reachable } from './web-part.mjs';

const endWithParent = new URL('./end-with-parent.mjs', import.meta.url).href;
const guardian = fileURLToPath(new URL('./guardian.mjs', import.meta.url));

/**
 * The realtime process: its bundle, or in development its source, started again when it changes.
 * @param {{ root: string, build: string | undefined, host: string, port: number, env: NodeJS.ProcessEnv, logFile: string }} input
 * @returns {import('./part.mjs').PartPlan}
 */
export function realtimePart({ root, build, host, port, env, logFile }) {
  const args = build
    ? ['--import', endWithParent, '--enable-source-maps', path.join(root, build, 'programs/realtime.mjs')]
    : [guardian, process.execPath, path.join(root, 'node_modules/tsx/dist/cli.mjs'), 'watch', '--clear-screen=false', path.join(root, 'realtime/server/main.ts')];
  return {
    name: 'Realtime',
    command: process.execPath,
    args,
    env: { ...env, NODE_ENV: build ? 'production' : 'development' },
    cwd: root,
    logFile,
    graceMs: 12_000,
    echo: !build,
    ready: async () => (await fetch(`http://${reachable(host)}:${port}/ready`, { signal: AbortSignal.timeout(5_000) })).status === 200,
  };
}
