/**
 * Why the server closed a sheet socket, and what the client does then. The retry meaning is the contract:
 * `retry` reconnects with back-off, `reload` reconnects with a fresh copy, `stop` waits for the person.
 */
export const closeCodes = {
  tooBig: { code: 1009, then: 'stop', words: 'The edit is too big to send. It is kept on this device.' },
  ourFault: { code: 1011, then: 'retry', words: 'Something went wrong on our side. Trying again.' },
  restarting: { code: 1012, then: 'retry', words: 'The server is restarting. Trying again.' },
  overloaded: { code: 1013, then: 'retry', words: 'The server cannot take this now. Trying again.' },
  badProtocol: { code: 4400, then: 'stop', words: 'This page and the server do not understand each other. Reload the page.' },
  accessGone: { code: 4401, then: 'stop', words: 'You can no longer open this sheet. Sign in again or ask its maker.' },
  roleChanged: { code: 4403, then: 'retry', words: 'Your part in this circuit changed. Opening it anew.' },
  deleted: { code: 4404, then: 'stop', words: 'This sheet is gone.' },
  rejected: { code: 4409, then: 'reload', words: 'An edit was refused. Opening a fresh copy.' },
  clientTooOld: { code: 4426, then: 'stop', words: 'This page is older than the server. Reload the page.' },
} as const satisfies Record<string, { code: number; then: 'retry' | 'reload' | 'stop'; words: string }>;

export type CloseReason = keyof typeof closeCodes;

const byCode = new Map<number, CloseReason>(
  Object.entries(closeCodes).map(([reason, { code }]) => [code, reason as CloseReason]),
);

/** The reason behind a close code; undefined for codes that are not ours (network loss is 1006). */
export function closeReasonOf(code: number): CloseReason | undefined {
  return byCode.get(code);
}

/** What the client does after `code`; anything unknown is a lost connection and is tried again. */
export function afterClose(code: number): 'retry' | 'reload' | 'stop' {
  const reason = closeReasonOf(code);
  return reason === undefined ? 'retry' : closeCodes[reason].then;
}
