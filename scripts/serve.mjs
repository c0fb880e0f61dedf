/**
 * Runs one process of the built product in the foreground, for a service manager: `web`, `realtime` or `migrate`.
 * The environment says the rest (README.md, "In production").
 */
import { spawn } from 'node:child_process';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { ensureBuild } from './build/build.mjs';
import { serveFrom } from './build/builds-in-use.mjs';

const root = fileURLToPath(new URL('..', import.meta.url));
const name = process.argv[2] ?? '';
const build = await ensureBuild(root);

/** @type {Readonly<Record<string, readonly string[]>>} */
const programs = {
  web: [
    path.join(root, 'node_modules/next/dist/bin/next'), 'start', root, '--port', process.env.PORT || '3000', '--hostname', process.env.HOST || '127.0.0.1',
  ],
  realtime: ['--enable-source-maps', path.join(root, build, 'programs/realtime.mjs')],
  migrate: [path.join(root, build, 'programs/migrate.mjs')],
};
const args = programs[name];
if (!args) {
  process.stderr.write(`Say which process: ${Object.keys(programs).join(', ')}.\n`);
  process.exit(2);
}

const done = serveFrom(root, build);
const child = spawn(process.execPath, [...args], {
  cwd: root, stdio: 'inherit', env: { ...process.env, NODE_ENV: 'production', NEXT_TELEMETRY_DISABLED: '1', HOLDOFF_DIST_DIR: build },
});
for (const signal of /** @type {const} */ (['SIGTERM', 'SIGINT', 'SIGHUP'])) process.on(signal, () => child.kill(signal));
child.once('exit', (code, signal) => {
  done();
  process.exit(code ?? (signal === 'SIGTERM' || signal === 'SIGINT' ? 0 : 1));
});
