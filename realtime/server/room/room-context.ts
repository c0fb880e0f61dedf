import type { Logger } from 'pino';
import type * as Y from 'yjs';
import type { Database } from '@/db/client';

/** What every room works with. Times in milliseconds. */
export interface RoomContext {
  readonly db: Database;
  readonly log: Pick<Logger, 'info' | 'warn' | 'error'>;
  /** Content hash of the sheet in a document; two sheets that differ electrically differ in it. */
  readonly contentHash: (doc: Y.Doc) => string;
  readonly timing: RoomTiming;
}

export interface RoomTiming {
  /** A snapshot is taken after this many rows or bytes of log, or after this long without an edit. */
  readonly snapshotRows: number;
  readonly snapshotBytes: number;
  readonly snapshotIdle: number;
  /** An empty room is let go after this long. */
  readonly unloadIdle: number;
  /** A commit that takes longer is shown as 'not saving'. */
  readonly slowCommit: number;
  /** First and longest pause between tries to reach the database again. */
  readonly recoveryFirst: number;
  readonly recoveryLongest: number;
}

export const roomTiming: RoomTiming = {
  snapshotRows: 500, snapshotBytes: 1024 * 1024, snapshotIdle: 60_000, unloadIdle: 60_000, slowCommit: 1_500, recoveryFirst: 100, recoveryLongest: 2_000,
};
