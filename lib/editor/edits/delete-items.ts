import { pinPlacesOf, type PinPlace } from '@/lib/document/geometry/pin-place';
import { pointKey } from '@/lib/document/geometry/point';
import { endKey, indexOf } from '@/lib/document/geometry/sheet-index';
import type { PartRecord, Sheet, WireEnd, WireRecord } from '@/lib/document/records';
import type { NewId } from './edit';
import { tidyWiring } from './tidy-wiring';

const markKinds: ReadonlySet<string> = new Set(['zero-volt', 'net-name']);

/**
 * Takes parts, wires and junctions off the sheet. What was joined through a pin that goes stays joined: lines that met
 * there run on. A line that led to that pin alone goes with it, and so does a 0 V symbol or name that stood on nothing
 * else. What the plan said of a source that goes is forgotten.
 */
export function deleteItems(sheet: Sheet, ids: ReadonlySet<string>, newId: NewId): Sheet {
  const parts = sheet.parts.filter((part) => ids.has(part.id));
  const gone = new Set(sheet.wires.filter((wire) => ids.has(wire.id) || [wire.a, wire.b].some((end) => end.at === 'junction' && ids.has(end.junction))).map((wire) => wire.id));
  if (gone.size === 0 && parts.length === 0) return sheet;
  const left = leaveWires(sheet, parts, gone, newId);
  dropStubs(left, gone);
  const removed = new Set([...parts.map((part) => part.id), ...strandedMarks(sheet, parts, gone)]);
  return tidyWiring({
    ...withoutSources(left, removed),
    parts: removed.size === 0 ? sheet.parts : sheet.parts.filter((part) => !removed.has(part.id)),
    wires: left.wires.filter((wire) => !gone.has(wire.id)),
  });
}

/** Gives wires that end at pins that go another end, or adds them to `gone`. */
function leaveWires(sheet: Sheet, parts: readonly PartRecord[], gone: Set<string>, newId: NewId): Sheet {
  const leaving = new Map<string, PinPlace>(parts.flatMap((part) => pinPlacesOf(part).map((pin) => [`pin:${pin.part}:${pin.pin}`, pin] as const)));
  const staying = new Map(sheet.parts.filter((part) => !parts.includes(part)).flatMap((part) => pinPlacesOf(part).map((pin) => [pointKey(pin), pin] as const)));
  const { wiresAt } = indexOf(sheet);
  for (const wire of sheet.wires) if (leaving.has(endKey(wire.a)) && leaving.has(endKey(wire.b))) gone.add(wire.id);
  const kept = (key: string) => (wiresAt.get(key) ?? []).filter((wire) => !gone.has(wire.id));
  for (let grown = true; grown;) {
    grown = false;
    for (const [key, pin] of leaving) {
      const [only, ...more] = kept(key);
      if (!only || more.length > 0 || staying.has(pointKey(pin))) continue;
      gone.add(only.id);
      grown = true;
    }
  }
  const junctions: { id: string; x: number; y: number }[] = [];
  const ends = new Map<string, WireEnd>();
  for (const [key, pin] of leaving) if (kept(key).length > 0) ends.set(key, endFor(pin, staying, junctions, newId));
  const follow = (end: WireEnd) => ends.get(endKey(end)) ?? end;
  const moved = (wire: WireRecord) => (ends.has(endKey(wire.a)) || ends.has(endKey(wire.b)) ? { ...wire, a: follow(wire.a), b: follow(wire.b) } : wire);
  return { ...sheet, wires: sheet.wires.map(moved), junctions: [...sheet.junctions, ...junctions] };
}

function endFor(pin: PinPlace, staying: ReadonlyMap<string, PinPlace>, junctions: { id: string; x: number; y: number }[], newId: NewId): WireEnd {
  const other = staying.get(pointKey(pin));
  if (other) return { at: 'pin', part: other.part, pin: other.pin };
  const junction = { id: newId(), x: pin.x, y: pin.y };
  junctions.push(junction);
  return { at: 'junction', junction: junction.id };
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

/** 0 V symbols and names that stood on a pin that goes, and on nothing else. */
function strandedMarks(sheet: Sheet, parts: readonly PartRecord[], gone: ReadonlySet<string>): readonly string[] {
  const bare = new Set(parts.flatMap((part) => pinPlacesOf(part).map(pointKey)));
  const held = new Set(sheet.parts.filter((part) => !parts.includes(part) && !markKinds.has(part.kind)).flatMap((part) => pinPlacesOf(part).map(pointKey)));
  const { wiresAt } = indexOf(sheet);
  return sheet.parts.filter((part) => {
    const [pin] = pinPlacesOf(part);
    if (!pin || !markKinds.has(part.kind) || parts.includes(part) || !bare.has(pointKey(pin)) || held.has(pointKey(pin))) return false;
    const wires = [part, ...parts].flatMap((one) => pinPlacesOf(one).filter((place) => pointKey(place) === pointKey(pin))
      .flatMap((place) => wiresAt.get(`pin:${one.id}:${place.pin}`) ?? []));
    return wires.every((wire) => gone.has(wire.id));
  }).map((part) => part.id);
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
