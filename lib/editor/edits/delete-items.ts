import { endKey, indexOf } from '@/lib/document/geometry/sheet-index';
import type { Sheet, WireEnd } from '@/lib/document/records';
import { tidyWiring } from './tidy-wiring';

/**
 * Takes parts, wires and junctions off the sheet. Wires of a part that goes leave with it, and so does a stub that this
 * leaves hanging; wires that met them run on as one. What the plan said of a source that goes is forgotten.
 */
export function deleteItems(sheet: Sheet, ids: ReadonlySet<string>): Sheet {
  const gonePart = (end: WireEnd) => end.at === 'pin' && ids.has(end.part);
  const goneJunction = (end: WireEnd) => end.at === 'junction' && ids.has(end.junction);
  const gone = new Set(sheet.wires.filter((wire) => ids.has(wire.id) || [wire.a, wire.b].some((end) => gonePart(end) || goneJunction(end))).map((wire) => wire.id));
  const parts = sheet.parts.filter((part) => !ids.has(part.id));
  if (gone.size === 0 && parts.length === sheet.parts.length) return sheet;
  dropStubs(sheet, gone);
  return tidyWiring({
    ...withoutSources(sheet, ids), parts: parts.length === sheet.parts.length ? sheet.parts : parts,
    wires: sheet.wires.filter((wire) => !gone.has(wire.id)),
  });
}

/** Adds wires that now hang loose at a junction where a wire was taken away. */
function dropStubs(sheet: Sheet, gone: Set<string>): void {
  const { wiresAt } = indexOf(sheet);
  for (let grown = true; grown;) {
    grown = false;
    for (const wire of sheet.wires) {
      if (gone.has(wire.id)) continue;
      const hangs = [wire.a, wire.b].some((end) => {
        if (end.at !== 'junction') return false;
        const others = (wiresAt.get(endKey(end)) ?? []).filter((other) => other !== wire);
        return others.length > 0 && others.every((other) => gone.has(other.id));
      });
      if (!hangs) continue;
      gone.add(wire.id);
      grown = true;
    }
  }
}

function withoutSources(sheet: Sheet, ids: ReadonlySet<string>): Sheet {
  const holdPoints = sheet.holdPoints.map((point) => {
    if (point.source === undefined || !ids.has(point.source)) return point;
    const { source: _gone, ...rest } = point;
    return rest;
  });
  const scenarios = sheet.scenarios.map((scenario) => (Object.keys(scenario.values).some((id) => ids.has(id))
    ? { ...scenario, values: Object.fromEntries(Object.entries(scenario.values).filter(([id]) => !ids.has(id))) } : scenario));
  return { ...sheet, holdPoints, scenarios };
}
