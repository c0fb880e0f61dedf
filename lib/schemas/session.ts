import { z } from 'zod';
import { benchRoleSchema } from './bench';

/** Addresses compare without case and are stored in lower case. */
export const emailSchema = z.string().trim().toLowerCase().max(254, 'This address is too long.')
  .pipe(z.email('This does not look like an e-mail address.'));

export const signInSchema = z.strictObject({
  email: emailSchema,
  password: z.string().min(1, 'Type your password.').max(256, 'This is longer than any password here.'),
});
export type SignIn = z.infer<typeof signInSchema>;

/** Who am I. */
export const whoSchema = z.object({
  person: z.object({ id: z.string(), name: z.string(), email: z.string() }),
  benches: z.array(z.object({ slug: z.string(), name: z.string(), role: benchRoleSchema })),
});
export type Who = z.infer<typeof whoSchema>;

/** One of a person's own sessions. `id` names it for ending; it is not the cookie. */
export const ownSessionSchema = z.object({
  id: z.string(), signedInAt: z.string(), lastUsedAt: z.string(), userAgent: z.string(), current: z.boolean(),
});
export type OwnSession = z.infer<typeof ownSessionSchema>;

/** Ends one session, or every other one when `id` is left out. */
export const endSessionsSchema = z.strictObject({ id: z.string().regex(/^[0-9a-f]{64}$/, 'This is not the id of a session.').optional() });
