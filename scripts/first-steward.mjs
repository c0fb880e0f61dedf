/**
 * `npm run -s first-steward -- --name … --email … --bench …`: on DATABASE_URL, or on the database of a running `npm start`
 * (DATA_DIR says which).
 */
import { spawnSync } from 'node:child_process';
import path from 'node:path';
import { fileURLToPath } from 'node:url';
import { ensureBuild } from './build/build.mjs';
import { readPrivate } from './data/private-file.mjs';

const root = fileURLToPath(new URL('..', import.meta.url));
const data = path.resolve(process.env.DATA_DIR || '.data');
const address = process.env.DATABASE_URL || readPrivate(path.join(data, 'lock.json'))?.databaseUrl;
if (!address) {
  process.stderr.write('Which database? Set DATABASE_URL, or leave `npm start` running (with the same DATA_DIR) while you do this.\n');
  process.exit(1);
}
const program = path.join(root, await ensureBuild(root), 'programs/first-steward.mjs');
const { status } = spawnSync(process.execPath, [program, ...process.argv.slice(2)], {
  cwd: root, stdio: 'inherit', env: { ...process.env, DATABASE_URL: address },
});
process.exit(status ?? 1);
