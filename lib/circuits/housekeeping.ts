import type { Database } from '@/db/client';
import { forgetOldKeys } from '@/db/mutations/idempotency';
import { forgetEndedSessions } from '@/db/mutations/sessions';
import { forgetOldFailures } from '@/db/mutations/sign-in-delays';
import { logger } from '@/lib/log/logger';

const day = 86_400_000;
const every = 10 * 60_000;

/** Removes what has run out: ended sessions, wrong passwords of yesterday, idempotency keys older than a day. */
export async function tidy(db: Database, now = new Date()): Promise<void> {
  const ago = (ms: number) => new Date(now.getTime() - ms);
  await forgetEndedSessions(db, now);
  await forgetOldFailures(db, ago(day));
  await forgetOldKeys(db, ago(day));
}

/** Tidies now and then for as long as the process lives. */
export function tidyRegularly(db: Database): void {
  const run = () => void tidy(db).catch((error: unknown) => logger('housekeeping').warn({ err: error }, 'tidying failed'));
  setInterval(run, every).unref();
  run();
}
