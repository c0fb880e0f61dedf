import { z } from 'zod';

/** Ids are ULIDs: 26 characters of Crockford's base 32. */
export const idSchema = z.string().regex(/^[0-9A-HJKMNP-TV-Z]{26}$/, 'This is not an id.');

const noControl = /^[^\p{Cc}\p{Zl}\p{Zp}]*$/u;

/** Turns the direction of what follows, so that a name could be read as another. */
const turning = /^[^\u202A-\u202E\u2066-\u2069]*$/u;
/** Something to see: not only marks, spaces and format characters of no width. */
const visible = /[^\p{C}\p{Z}\p{M}]/u;

/** Names, titles and subjects: one line, no control characters, 1 to 120 characters once trimmed. */
export const lineSchema = z.string().trim()
  .min(1, 'Write something here.')
  .max(120, 'Keep it to 120 characters.')
  .regex(noControl, 'Keep it to one line without control characters.')
  .regex(turning, 'Characters that turn the direction of writing are not taken.')
  .regex(visible, 'Write something that can be seen.');

/** Plain text of several lines, at most `most` characters once trimmed; line ends and tabs are its only control characters. */
export const plainText = (most: number) => z.string().trim()
  .max(most, `Keep it to ${most.toLocaleString('en')} characters.`)
  .regex(/^[^\p{Cc}]*(?:[\n\r\t][^\p{Cc}]*)*$/u, 'Control characters are not taken.');

/** A message: plain text of 1 to 10,000 characters. */
export const textSchema = plainText(10_000).min(1, 'Write something here.');

/** A moment as ISO 8601 in UTC. */
export const momentSchema = z.iso.datetime();

/** Who somebody is to other people of the bench. Guests get initials for `name`. */
export const personRefSchema = z.object({ id: z.string(), name: z.string() });
export type PersonRef = z.infer<typeof personRefSchema>;
