import { createHash } from 'node:crypto';

function digest(words: readonly (string | number | boolean | null)[], bytes: Uint8Array): string {
  return createHash('sha256').update(`${JSON.stringify(words)}\n`).update(bytes).digest('hex');
}

export interface UpdateRowContent {
  readonly seq: number;
  readonly instanceId: string;
  readonly clientSeq: number;
  readonly actorId: string;
  readonly sessionId: string | null;
  readonly electrical: boolean;
  readonly bytes: Uint8Array;
}

/** SHA-256 over everything a row of the log says, so that a changed byte anywhere in it is noticed. */
export function updateChecksum(roomId: string, row: UpdateRowContent): string {
  return digest([roomId, row.seq, row.instanceId, row.clientSeq, row.actorId, row.sessionId, row.electrical], row.bytes);
}

export interface SnapshotPartContent {
  readonly uptoSeq: number;
  readonly part: number;
  readonly parts: number;
  readonly bytes: Uint8Array;
}

/** SHA-256 over one stored part of a snapshot and its place in the whole. */
export function snapshotChecksum(roomId: string, part: SnapshotPartContent): string {
  return digest([roomId, part.uptoSeq, part.part, part.parts], part.bytes);
}
