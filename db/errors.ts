/** The driver's error code behind what Drizzle throws (`ER_DUP_ENTRY` …), or undefined. */
export function databaseErrorCode(error: unknown): string | undefined {
  for (let at: unknown = error, depth = 0; at instanceof Error && depth < 5; at = at.cause, depth += 1) {
    const code: unknown = Reflect.get(at, 'code');
    if (typeof code === 'string') return code;
  }
  return undefined;
}

export function isDuplicate(error: unknown): boolean {
  return databaseErrorCode(error) === 'ER_DUP_ENTRY';
}

const deadlocks = new Set(['ER_LOCK_DEADLOCK', 'ER_LOCK_WAIT_TIMEOUT', 'ER_CHECKREAD']);

export function isDeadlock(error: unknown): boolean {
  return deadlocks.has(databaseErrorCode(error) ?? '');
}

const outages = new Set([
  'ECONNREFUSED', 'ECONNRESET', 'ENOENT', 'EPIPE', 'ETIMEDOUT', 'PROTOCOL_CONNECTION_LOST', 'ER_SERVER_SHUTDOWN',
  'ER_CON_COUNT_ERROR', 'ER_DISK_FULL', 'ER_RECORD_FILE_FULL', 'ER_OPTION_PREVENTS_STATEMENT', 'ER_OUT_OF_RESOURCES',
  'ER_CONNECTION_KILLED', 'ER_ERROR_ON_WRITE', 'POOL_CLOSED',
]);

/** True when the database is stopped, unreachable, read-only or full: our fault, worth a repeat, nothing was saved. */
export function isOutage(error: unknown): boolean {
  return outages.has(databaseErrorCode(error) ?? '');
}
