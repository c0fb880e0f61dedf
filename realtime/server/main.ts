import { closeDatabase, database } from '@/db/client';
import { environment } from '@/lib/env/environment';
import { requireSetting } from '@/lib/env/require-setting';
import { logger } from '@/lib/log/logger';
import { limits } from '@/realtime/limits';
import { documentHash } from './room/content-hash';
import { roomTiming } from './room/room-context';
import { serveRealtime } from './serve-realtime';

/** The realtime process. Ends on SIGTERM or SIGINT with what it took in committed. */
const env = environment();
const log = logger('realtime');
requireSetting('DATABASE_URL');

const running = await serveRealtime(
  { db: database(), log, contentHash: documentHash, timing: roomTiming },
  {
    host: env.HOST, port: env.REALTIME_PORT, secret: requireSetting('INTERNAL_SECRET'), publicUrl: env.PUBLIC_URL,
    trustProxy: env.TRUST_PROXY,
  },
);
log.info({ port: running.port }, 'realtime is ready');

let ending = false;
async function end(): Promise<void> {
  if (ending) return;
  ending = true;
  setTimeout(() => process.exit(1), limits.shutdown).unref();
  await running.close();
  await closeDatabase();
  log.info({}, 'realtime ended');
}
for (const signal of ['SIGTERM', 'SIGINT'] as const) process.on(signal, () => void end());
