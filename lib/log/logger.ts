import { pino, stdSerializers, type Logger } from 'pino';
import { environment } from '@/lib/env/environment';
import { redactedPaths, withoutAddresses } from './redact';

/** An error as it is logged: type, message and stack, with mail addresses taken out (a database error can quote a row). */
function errorForLog(error: unknown): unknown {
  if (!(error instanceof Error)) return error;
  const plain = stdSerializers.err(error);
  return { type: plain.type, message: withoutAddresses(plain.message), stack: withoutAddresses(plain.stack), code: Reflect.get(error, 'code') };
}

let root: Logger | undefined;

/**
 * The log of one part of a process, as JSON lines on standard output. Pass facts as the first argument
 * (`requestId`, `personId`, `circuitId`): ids only, never tokens, mail addresses or presence.
 */
export function logger(part: string): Logger {
  root ??= pino({
    level: environment().LOG_LEVEL,
    base: null,
    timestamp: () => `,"time":"${new Date().toISOString()}"`,
    redact: { paths: [...redactedPaths], censor: '[removed]' },
    serializers: { err: errorForLog, error: errorForLog },
  });
  return root.child({ part });
}
