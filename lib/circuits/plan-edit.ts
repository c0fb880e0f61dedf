import { setPlan } from '@/lib/document/plan/set-plan';
import type { Sheet } from '@/lib/document/records';
import { Problem } from '@/lib/errors/problem';
import type { Plan } from '@/lib/schemas/hold-point';

/**
 * The sheet with another power-up plan. A hold point of the same name keeps its id; a scenario not yet known is made, empty.
 * Throws 422 with row and field when the sheet cannot have it, as when a `source` is no part of it.
 */
export function withPlan(sheet: Sheet, plan: Plan, newId: () => string): Sheet {
  const answer = setPlan(sheet, plan, newId);
  if (answer.ok) return answer.sheet;
  const { index, field, reason } = answer;
  throw new Problem('input-wrong', `${index + 1}. hold point: ${reason}`, { errors: [{ path: `${index}.${field}`, message: reason }] });
}
