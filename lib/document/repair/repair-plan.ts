import type { HoldPointRecord, PartRecord, ScenarioRecord } from '../records';
import type { CollectionName } from '../stored-sheet';
import type { Repair, Repaired } from './repair';

const maxName = 120;

/** Gives a second record of the same name (two people added one at once) the next free number; the lower id keeps the name. */
function uniqueNames<T extends { readonly id: string; readonly name: string }>(
  records: readonly T[], collection: CollectionName, repairs: Repair[],
): T[] {
  const taken = new Set<string>();
  return records.map((record) => {
    let name = record.name;
    for (let number = 2; taken.has(name); number += 1) {
      const tail = ` (${number})`;
      name = record.name.slice(0, maxName - tail.length) + tail;
    }
    taken.add(name);
    if (name === record.name) return record;
    repairs.push({ collection, id: record.id, reason: `the name ${record.name} is taken` });
    return { ...record, name };
  });
}

/** Names made unique, values of parts that are gone left out, the plan in ascending order of volts. */
export function repairPlan(
  parts: readonly PartRecord[], scenarios: readonly ScenarioRecord[], holdPoints: readonly HoldPointRecord[],
): { readonly scenarios: Repaired<ScenarioRecord>; readonly holdPoints: Repaired<HoldPointRecord> } {
  const partIds = new Set(parts.map((part) => part.id));
  const scenarioIds = new Set(scenarios.map((scenario) => scenario.id));
  const scenarioRepairs: Repair[] = [];
  const pointRepairs: Repair[] = [];
  const keptScenarios = uniqueNames(scenarios, 'scenarios', scenarioRepairs).map((scenario) => {
    const gone = Object.keys(scenario.values).filter((part) => !partIds.has(part));
    if (gone.length === 0) return scenario;
    scenarioRepairs.push({ collection: 'scenarios', id: scenario.id, reason: 'sets a part that is gone' });
    return { ...scenario, values: Object.fromEntries(Object.entries(scenario.values).filter(([part]) => partIds.has(part))) };
  });
  const keptPoints = uniqueNames(holdPoints, 'holdPoints', pointRepairs).map((point) => {
    const { source, scenario, ...rest } = point;
    const sourceGone = source !== undefined && !partIds.has(source);
    const scenarioGone = scenario !== undefined && !scenarioIds.has(scenario);
    if (!sourceGone && !scenarioGone) return point;
    pointRepairs.push({ collection: 'holdPoints', id: point.id, reason: sourceGone ? 'its source is gone' : 'its scenario is gone' });
    return { ...rest, ...(source && !sourceGone ? { source } : {}), ...(scenario && !scenarioGone ? { scenario } : {}) };
  });
  keptPoints.sort((a, b) => a.volts - b.volts || (a.id < b.id ? -1 : 1));
  return { scenarios: { kept: keptScenarios, repairs: scenarioRepairs }, holdPoints: { kept: keptPoints, repairs: pointRepairs } };
}
