import { z } from 'zod';

export const partStates = ['ok', 'idle', 'down', 'off'] as const;
/** Each part's state, no secrets. `engine` is `idle` until first used; `off` says that a part is not configured here. */
export const healthSchema = z.object({
  status: z.enum(['ok', 'down']),
  database: z.enum(partStates),
  realtime: z.enum(partStates),
  engine: z.enum(partStates),
  storage: z.enum(partStates),
  mail: z.enum(partStates),
});
export type Health = z.infer<typeof healthSchema>;
