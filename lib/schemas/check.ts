import { z } from 'zod';
import { findingSchema } from '@/lib/netlist/findings/finding';

/** What the file checker prints for one file, without `file`. */
export const checkAnswerSchema = z.object({
  findings: z.array(findingSchema),
  undetermined: z.array(findingSchema),
  errors: z.array(z.object({ line: z.number().nullable(), reason: z.string() })),
  notices: z.array(z.unknown()),
  /** Node volts by run: `as drawn`, or `<scenario>/<state>`. */
  op: z.record(z.string(), z.record(z.string(), z.number())),
});
