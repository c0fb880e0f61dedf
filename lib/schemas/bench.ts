import { z } from 'zod';
import { lineSchema } from './text';

export const benchRoles = ['member', 'mentor', 'steward'] as const;
export const benchRoleSchema = z.enum(benchRoles);
export type BenchRole = z.infer<typeof benchRoleSchema>;

/** A bench's slug: what stands for it in addresses. */
export const slugSchema = z.string().regex(/^[a-z0-9]+(?:-[a-z0-9]+)*$/, 'Lower-case letters, digits and hyphens.').max(60);

export const benchSchema = z.object({ id: z.string(), slug: z.string(), name: z.string(), role: benchRoleSchema });
export type Bench = z.infer<typeof benchSchema>;

export const newBenchSchema = z.strictObject({ name: lineSchema, slug: slugSchema.optional() });
export type NewBench = z.infer<typeof newBenchSchema>;

export const memberSchema = z.object({
  id: z.string(), name: z.string(), email: z.string(), role: benchRoleSchema, since: z.string(),
});
export type Member = z.infer<typeof memberSchema>;
