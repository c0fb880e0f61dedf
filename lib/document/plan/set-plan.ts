import { holdPointRecordSchema, scenarioRecordSchema, type HoldPointRecord, type ScenarioRecord, type Sheet } from '../records';

/** A hold point as people and the HTTP surface write it: scenario by name, source by designator. */
export interface PlannedPoint {
  readonly name: string;
  readonly scenario?: string | undefined;
  readonly source?: string | undefined;
  readonly volts: number;
  readonly amps: number;
}

export type PlanField = 'name' | 'scenario' | 'source' | 'volts' | 'amps' | 'ambient';

export type PlanAnswer =
  | { readonly ok: true; readonly sheet: Sheet }
  /** Why not, and at which row and field. */
  | { readonly ok: false; readonly reason: string; readonly index: number; readonly field: PlanField };

/** Kinds whose volts a hold point can raise. */
const sourceKinds: ReadonlySet<string> = new Set(['dc-source', 'dc-supply', 'signal-generator', 'ac-mains']);

/**
 * Replaces the power-up plan. Points ascend by volts and have unique names; a scenario not yet known is made, empty; a
 * point that keeps its name keeps its id. Refuses with the reason and the row, and changes nothing then.
 */
export function setPlan(sheet: Sheet, points: readonly PlannedPoint[], newId: () => string): PlanAnswer {
  const scenarios: ScenarioRecord[] = [...sheet.scenarios];
  const holdPoints: HoldPointRecord[] = [];
  for (const [index, { name: typed, scenario, source, volts, amps }] of points.entries()) {
    const no = (field: PlanField, reason: string): PlanAnswer => ({ ok: false, reason, index, field });
    const name = typed.trim();
    if (holdPoints.some((point) => point.name === name)) return no('name', `Two hold points are called ${name}. Each needs a name of its own.`);
    const last = holdPoints.at(-1);
    if (last && volts <= last.volts) return no('volts', `${name} is not above ${last.name}. Hold points ascend by volts.`);
    const part = source === undefined ? undefined : sheet.parts.find((one) => one.ref === source);
    if (source !== undefined && !part) return no('source', `The sheet has no part ${source}.`);
    if (part && !sourceKinds.has(part.kind)) return no('source', `${part.ref} is not a source. A hold point raises the volts of one.`);
    if (scenario !== undefined && !scenarios.some((one) => one.name === scenario)) {
      const made = scenarioRecordSchema.safeParse({ id: newId(), name: scenario, ambient: 25, values: {} });
      if (!made.success) return no('scenario', 'A scenario needs a name of one line, at most 120 characters.');
      scenarios.push(made.data);
    }
    const parsed = holdPointRecordSchema.safeParse({
      id: sheet.holdPoints.find((point) => point.name === name)?.id ?? newId(), name, volts, amps,
      ...(part ? { source: part.id } : {}),
      ...(scenario === undefined ? {} : { scenario: scenarios.find((one) => one.name === scenario)?.id }),
    });
    if (!parsed.success) {
      const field = parsed.error.issues[0]?.path[0];
      return no(field === 'volts' || field === 'amps' ? field : 'name', planProblem(field));
    }
    holdPoints.push(parsed.data);
  }
  return { ok: true, sheet: { ...sheet, scenarios, holdPoints } };
}

function planProblem(field: PropertyKey | undefined): string {
  if (field === 'volts') return 'Volts are above 0 and at most 100 kV.';
  if (field === 'amps') return 'The current limit is above 0 and at most 10 kA.';
  return 'A hold point needs a name of one line, at most 120 characters.';
}

/** Adds or replaces a scenario. */
export function putScenario(sheet: Sheet, scenario: ScenarioRecord): PlanAnswer {
  const parsed = scenarioRecordSchema.safeParse({ ...scenario, name: scenario.name.trim() });
  if (!parsed.success) {
    const ambient = parsed.error.issues[0]?.path[0] === 'ambient';
    return { ok: false, index: 0, field: ambient ? 'ambient' : 'name', reason: ambient ? 'The ambient temperature lies from -55 to 150 °C.' : 'A scenario needs a name of one line, at most 120 characters.' };
  }
  if (sheet.scenarios.some((other) => other.id !== scenario.id && other.name === parsed.data.name)) {
    return { ok: false, index: 0, field: 'name', reason: `Another scenario is called ${parsed.data.name}.` };
  }
  const known = sheet.scenarios.some((other) => other.id === scenario.id);
  const scenarios = known ? sheet.scenarios.map((other) => (other.id === scenario.id ? parsed.data : other)) : [...sheet.scenarios, parsed.data];
  return { ok: true, sheet: { ...sheet, scenarios } };
}

/** Takes a scenario away; hold points that used it stay, without one. */
export function dropScenario(sheet: Sheet, id: string): Sheet {
  const holdPoints = sheet.holdPoints.map((point) => {
    if (point.scenario !== id) return point;
    const { scenario: _gone, ...rest } = point;
    return rest;
  });
  return { ...sheet, holdPoints, scenarios: sheet.scenarios.filter((scenario) => scenario.id !== id) };
}
