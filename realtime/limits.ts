const kib = 1024;

/** Spoken by client and server alike; a client with another number is told to reload. */
export const protocolVersion = 1;
/** Version of the sheet's records, `lib/document`. */
export const schemaVersion = 1;
export const subprotocol = 'holdoff.v1';

/** Sizes in bytes, times in milliseconds. */
export const limits = {
  /** One inbound frame, and so one edit. */
  frameBytes: 1024 * kib,
  /** Kind, client seq and length before the edit's own bytes. */
  editOverheadBytes: 32,
  /** Everything a socket may send before it is let in. */
  preAuthBytes: 16 * kib,
  helloDeadline: 5_000,
  partBytes: 256 * kib,
  presenceBytes: 2 * kib,
  presencePerSecond: 10,
  needPerSecond: 4,
  /** A copy further behind than this gets the whole sheet instead of rows. */
  needRows: 500,
  pingEvery: 20_000,
  pingMisses: 3,
  /** Unanswered edits a connection may have with the server. */
  editsInFlight: 256,
  clientIdsPerHello: 64,
  connectionsPerAddress: 64,
  connectionsPerPerson: 32,
  ticketLife: 30_000,
  grantPoll: 2_000,
  shutdown: 30_000,
} as const;

/** The largest Yjs update that fits a frame. */
export const maxEditBytes = limits.frameBytes - limits.editOverheadBytes;
