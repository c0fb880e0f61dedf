import { z } from 'zod';
import { nackReasons } from './protocol';

/**
 * What web tells the realtime process over loopback: `POST` as JSON with `Authorization: Bearer` and the shared secret.
 * Ids are ULIDs; a session's id is the SHA-256 of its cookie.
 */

const ulid = z.string().length(26);

/** `/internal/append`: one edit over HTTP. Answers after COMMIT. */
export const appendCallSchema = z.object({
  circuitId: ulid,
  actorId: ulid,
  /** Null for a personal access token and for the seed. */
  sessionId: z.string().min(1).max(64).nullable(),
  /** A Yjs update, base64. */
  update: z.base64().max(1_500_000),
  /** Refused as `sheet-moved` unless this is the head; left out it merges whatever the head. */
  baseSeq: z.number().int().min(0).optional(),
  /** A repeat with the same key gets the first one's seq. */
  key: z.string().min(1).max(76),
});
export type AppendCall = z.infer<typeof appendCallSchema>;

/**
 * Answers of `/internal/append`: 200 committed; 409 `sheet-moved` with the head; 403 `not-allowed`; 404 `not-found`;
 * 422 `refused` with the room's reason; 503 `unavailable` (nothing is known to be stored, send it again with the same key).
 */
export const appendAnswerSchema = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('committed'), seq: z.number().int() }),
  z.object({ kind: z.literal('sheet-moved'), seq: z.number().int() }),
  z.object({ kind: z.literal('not-allowed') }),
  z.object({ kind: z.literal('not-found') }),
  z.object({ kind: z.literal('refused'), reason: z.enum(nackReasons), words: z.string() }),
  z.object({ kind: z.literal('unavailable'), words: z.string() }),
]);
export type AppendAnswer = z.infer<typeof appendAnswerSchema>;

/** `/internal/announce`: rows beside the sheet changed; every open page of the circuit reads that topic again. Answers 204. */
export const announceCallSchema = z.object({
  circuitId: ulid,
  /** A noun of the HTTP surface: `threads`, `revisions`, `findings`, `circuit`, `sign-offs` … */
  topic: z.string().min(1).max(40),
  /** Ids only: guests get it too. */
  data: z.record(z.string(), z.union([z.string().max(200), z.number(), z.boolean(), z.null()])).default({}),
});
export type AnnounceCall = z.input<typeof announceCallSchema>;

/** `/internal/revoke`: somebody's rights changed; sockets that it may concern are checked at once. Answers 204. */
export const revokeCallSchema = z.object({
  personId: ulid.optional(),
  sessionId: z.string().max(64).optional(),
  circuitId: ulid.optional(),
  linkId: ulid.optional(),
});
export type RevokeCall = z.infer<typeof revokeCallSchema>;
