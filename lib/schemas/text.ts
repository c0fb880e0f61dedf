import { z } from 'zod';

/** Ids are ULIDs: 26 characters of Crockford's base 32. */
export const idSchema = z.string().regex(/^[0-9A-HJKMNP-TV-Z]{26}$/, 'This is not an id.');

const noControl = /^[^\p{Cc}\p{Zl}\p{Zp}]*$/u;

/** Names, titles and subjects: one line, no control characters, 1 to 120 characters once trimmed. */
export const lineSchema = z.string().trim()
  .min(1, 'Write something here.')
  .max(120, 'Keep it to 120 characters.')
  .regex(noControl, 'Keep it to one line without control characters.');

/** Plain text of several lines, 1 to 10,000 characters once trimmed. */
export const textSchema = z.string().trim()
  .min(1, 'Write something here.')
  .max(10_000, 'Keep it to 10,000 characters.')
  .regex(/^[^\p{Cc}]*(?:[\n\r\t][^\p{Cc}]*)*$/u, 'Control characters are not taken.');

/** A moment as ISO 8601 in UTC. */
export const momentSchema = z.iso.datetime();

/** Who somebody is to other people of the bench. Guests get initials for `name`. */
export const personRefSchema = z.object({ id: z.string(), name: z.string() });
export type PersonRef = z.infer<typeof personRefSchema>;
