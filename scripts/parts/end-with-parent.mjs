/**
 * Loaded with `--import` into a part: when the parent's pipe (standard input) closes, the part ends as if it were told to,
 * and after a grace in any case. Nothing is left behind when the supervisor is killed.
 */
const graceMs = 12_000;

function end() {
  process.kill(process.pid, 'SIGTERM');
  setTimeout(() => process.exit(1), graceMs).unref();
}

/** Processes that a part starts inherit `--import`, and a pipe of their own that means nothing: only the supervisor's own child ends with it. */
if (process.env.HOLDOFF_SUPERVISOR === String(process.ppid)) {
  process.stdin.once('end', end).once('error', end);
  process.stdin.resume();
  // The pipe alone must not keep a finished part alive.
  if ('unref' in process.stdin) process.stdin.unref();
}
