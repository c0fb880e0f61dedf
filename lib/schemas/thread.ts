import { z } from 'zod';
import { personRefSchema, textSchema } from './text';

export const anchorKinds = ['part', 'net', 'finding', 'spot'] as const;
export const threadStates = ['open', 'answered', 'resolved'] as const;
export type ThreadState = (typeof threadStates)[number];

const spot = z.number().min(-20_000).max(20_000);

/** What a margin note is tied to, by stable id: part id, net name, a finding's fingerprint, or a place on the sheet. */
export const anchorSchema = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('part'), id: z.string().min(1).max(64), x: spot.optional(), y: spot.optional() }),
  z.strictObject({ kind: z.literal('net'), id: z.string().min(1).max(120), x: spot.optional(), y: spot.optional() }),
  z.strictObject({ kind: z.literal('finding'), id: z.string().min(1).max(128), x: spot.optional(), y: spot.optional() }),
  z.strictObject({ kind: z.literal('spot'), x: spot, y: spot }),
]);
export type Anchor = z.infer<typeof anchorSchema>;

export const messageSchema = z.object({
  id: z.string(), by: personRefSchema, at: z.string(), body: z.string(), editedAt: z.string().nullable(),
});
export type Message = z.infer<typeof messageSchema>;

export const threadSchema = z.object({
  id: z.string(),
  circuitId: z.string(),
  anchor: anchorSchema,
  status: z.enum(threadStates),
  mustAnswer: z.boolean(),
  by: personRefSchema,
  at: z.string(),
  /** Newest revision when the note was written; null before the first cut. */
  revision: z.object({ id: z.string(), letter: z.string() }).nullable(),
  messages: z.array(messageSchema),
});
export type Thread = z.infer<typeof threadSchema>;

export const newThreadSchema = z.strictObject({ anchor: anchorSchema, body: textSchema, mustAnswer: z.boolean().default(false) });
export type NewThread = z.infer<typeof newThreadSchema>;

export const newMessageSchema = z.strictObject({ body: textSchema });
/** Moves a thread on; `body` is added as a message by the same act. */
export const threadPatchSchema = z.strictObject({ status: z.enum(threadStates), body: textSchema.optional() });
export type ThreadPatch = z.infer<typeof threadPatchSchema>;
