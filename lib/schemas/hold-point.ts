import { z } from 'zod';
import { lineSchema } from './text';

/** A step of the power-up plan. `volts`: DC for a DC source, V rms for an AC one; `amps`: its current limit. */
export const holdPointSchema = z.strictObject({
  name: lineSchema,
  scenario: lineSchema.optional(),
  source: z.string().trim().min(1).max(40).optional(),
  volts: z.number('Volts as a number.').positive('Above 0 V.').max(100_000, 'At most 100 kV.'),
  amps: z.number('Amps as a number.').positive('Above 0 A.').max(10_000, 'At most 10 kA.'),
});
export type HoldPointInput = z.infer<typeof holdPointSchema>;

/** The whole plan: ascending by volts, names unique. */
export const planSchema = z.array(holdPointSchema).max(50, 'At most 50 hold points.').superRefine((plan, context) => {
  const names = new Set<string>();
  plan.forEach((point, index) => {
    if (names.has(point.name)) context.addIssue({ code: 'custom', path: [index, 'name'], message: `“${point.name}” is in the plan twice.` });
    names.add(point.name);
    const before = plan[index - 1];
    if (before && point.volts <= before.volts) {
      context.addIssue({ code: 'custom', path: [index, 'volts'], message: 'Each hold point must be higher than the one before.' });
    }
  });
});
export type Plan = z.infer<typeof planSchema>;
