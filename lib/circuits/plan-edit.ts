import type { HoldPointRecord, ScenarioRecord, Sheet } from '@/lib/document/records';
import { Problem } from '@/lib/errors/problem';
import type { HoldPointInput, Plan } from '@/lib/schemas/hold-point';

const ambientUnlessSet = 25;

/**
 * The sheet with another power-up plan. A hold point of the same name keeps its id; a scenario not yet known is made, empty.
 * Throws 422 when a `source` is no part of the sheet.
 */
export function withPlan(sheet: Sheet, plan: Plan, newId: () => string): Sheet {
  const scenarios: ScenarioRecord[] = [...sheet.scenarios];
  const scenarioId = (name: string): string => {
    const known = scenarios.find((scenario) => scenario.name === name);
    if (known) return known.id;
    const made: ScenarioRecord = { id: newId(), name, ambient: ambientUnlessSet, values: {} };
    scenarios.push(made);
    return made.id;
  };
  const holdPoints = plan.map((point, index): HoldPointRecord => ({
    id: sheet.holdPoints.find(({ name }) => name === point.name)?.id ?? newId(),
    name: point.name, volts: point.volts, amps: point.amps,
    ...(point.scenario === undefined ? {} : { scenario: scenarioId(point.scenario) }),
    ...(point.source === undefined ? {} : { source: sourceId(sheet, point, index) }),
  }));
  return { ...sheet, scenarios, holdPoints };
}

function sourceId(sheet: Sheet, { source }: HoldPointInput, index: number): string {
  const part = sheet.parts.find(({ ref }) => ref === source);
  if (part) return part.id;
  const message = `The sheet has no part ${source}.`;
  throw new Problem('input-wrong', `${index + 1}. hold point: ${message}`, { errors: [{ path: `${index}.source`, message }] });
}
