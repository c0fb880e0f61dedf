/** Keys whose values never reach a log, at any of the depths that records have here. */
const secretKeys = [
  'password', 'token', 'ticket', 'secret', 'cookie', 'authorization', 'email', 'address', 'presence', 'url', 'body',
] as const;

/** Paths for pino's `redact`: each key at the top, one and two levels down. */
export const redactedPaths: readonly string[] = secretKeys.flatMap((key) => [key, `*.${key}`, `*.*.${key}`]);

/** Mail addresses inside free text, such as an error's message, replaced. */
export function withoutAddresses(text: string): string {
  return text.replace(/[^\s@<>"'`]{1,64}@[^\s@<>"'`]{1,255}/g, '[address]');
}
