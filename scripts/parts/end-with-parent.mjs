import { fstatSync } from 'node:fs';

/**
 * Loaded with `--import` into a part: when the parent's pipe (standard input) closes, the part ends as if it were told to,
 * and after a grace in any case. Nothing is left behind when the supervisor is killed.
 */
const graceMs = 12_000;

function end() {
  process.kill(process.pid, 'SIGTERM');
  setTimeout(() => process.exit(1), graceMs).unref();
}

/** Processes that a part starts inherit `--import` but not the pipe: /dev/null is at its end from the start and says nothing. */
function hasPipe() {
  try {
    const input = fstatSync(0);
    return input.isFIFO() || input.isSocket();
  } catch {
    return false;
  }
}

if (hasPipe()) {
  process.stdin.once('end', end).once('error', end);
  process.stdin.resume();
  // The pipe alone must not keep a finished part alive.
  if ('unref' in process.stdin) process.stdin.unref();
}
