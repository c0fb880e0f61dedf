import { z } from 'zod';
import { personRefSchema } from './text';

/** Details of an audit row: small, named, without secrets or free text that could be one. */
export const auditDetailSchema = z.record(z.string(), z.union([z.string(), z.number(), z.boolean(), z.null(), z.array(z.string())]));

export const auditRowSchema = z.object({
  id: z.string(),
  at: z.string(),
  /** Null when the server acted by itself. */
  by: personRefSchema.nullable(),
  action: z.string(),
  circuitId: z.string().nullable(),
  detail: auditDetailSchema,
});
export type AuditRow = z.infer<typeof auditRowSchema>;
export type AuditDetail = z.infer<typeof auditDetailSchema>;
