import { tidyPath } from '@/lib/document/geometry/corners';
import { pinPlacesOf } from '@/lib/document/geometry/pin-place';
import { pointKey, samePoint } from '@/lib/document/geometry/point';
import { endKey, endPlace, indexOf } from '@/lib/document/geometry/sheet-index';
import { wirePath } from '@/lib/document/geometry/wire-path';
import type { Sheet, WireEnd, WireRecord } from '@/lib/document/records';

/**
 * The same drawing with the fewest records: junctions at a pin or on each other become one end, a junction that joins
 * just two wires becomes a corner, wires without length, second copies and lone junctions go. Never changes what is joined.
 */
export function tidyWiring(sheet: Sheet): Sheet {
  let current = mergeEnds(sheet);
  for (let next = healOne(current); next !== current; next = healOne(current)) current = next;
  const used = new Set(current.wires.flatMap((wire) => [endKey(wire.a), endKey(wire.b)]));
  const junctions = current.junctions.filter((junction) => used.has(`junction:${junction.id}`));
  return junctions.length === current.junctions.length ? current : { ...current, junctions };
}

/** Ends at one place become one; what has no length or stands twice goes. */
function mergeEnds(sheet: Sheet): Sheet {
  const ends = new Map<string, WireEnd>();
  for (const part of sheet.parts) {
    for (const pin of pinPlacesOf(part)) if (!ends.has(pointKey(pin))) ends.set(pointKey(pin), { at: 'pin', part: part.id, pin: pin.pin });
  }
  const moved = new Map<string, WireEnd>();
  for (const junction of [...sheet.junctions].sort((a, b) => (a.id < b.id ? -1 : 1))) {
    const end = ends.get(pointKey(junction));
    if (end) moved.set(junction.id, end);
    else ends.set(pointKey(junction), { at: 'junction', junction: junction.id });
  }
  const follow = (end: WireEnd) => (end.at === 'junction' ? moved.get(end.junction) ?? end : end);
  const index = indexOf(sheet);
  const seen = new Set<string>();
  let changed = false;
  const wires = sheet.wires.flatMap((wire) => {
    const [a, b] = [follow(wire.a), follow(wire.b)];
    const from = endPlace(index, a);
    const to = endPlace(index, b);
    const twin = `${[endKey(a), endKey(b)].sort().join(' ')} ${JSON.stringify(wire.bends)}`;
    if (!from || !to || samePoint(from, to) || seen.has(twin)) {
      changed = true;
      return [];
    }
    seen.add(twin);
    if (a === wire.a && b === wire.b) return [wire];
    changed = true;
    return [{ ...wire, a, b }];
  });
  return changed ? { ...sheet, wires } : sheet;
}

/** Turns the first junction that joins just two wires into a corner of one wire; the sheet itself when there is none. */
function healOne(sheet: Sheet): Sheet {
  const index = indexOf(sheet);
  for (const junction of sheet.junctions) {
    const wires = index.wiresAt.get(`junction:${junction.id}`) ?? [];
    const [first, second] = wires;
    if (wires.length !== 2 || !first || !second || first === second) continue;
    const whole = joinWires(sheet, first, second, junction.id);
    const twin = sheet.wires.some((wire) => whole && wire !== first && wire !== second && sameWire(wire, whole));
    return {
      ...sheet,
      wires: sheet.wires.flatMap((wire) => (wire === first ? (whole && !twin ? [whole] : []) : wire === second ? [] : [wire])),
      junctions: sheet.junctions.filter((other) => other !== junction),
    };
  }
  return sheet;
}

const sameWire = (a: WireRecord, b: WireRecord): boolean =>
  JSON.stringify(a.bends) === JSON.stringify(b.bends)
  && [endKey(a.a), endKey(a.b)].sort().join(' ') === [endKey(b.a), endKey(b.b)].sort().join(' ');

/** Two wires that meet at a junction as one that is drawn alike; null when it would lead back to where it came from. */
function joinWires(sheet: Sheet, first: WireRecord, second: WireRecord, junction: string): WireRecord | null {
  const index = indexOf(sheet);
  const here = (end: WireEnd) => end.at === 'junction' && end.junction === junction;
  const [start, finish] = [here(first.a) ? first.b : first.a, here(second.a) ? second.b : second.a];
  if (endKey(start) === endKey(finish)) return null;
  const into = wirePath(index, first);
  const outOf = wirePath(index, second);
  const path = tidyPath([...(here(first.a) ? [...into].reverse() : into), ...(here(second.a) ? outOf : [...outOf].reverse())]);
  return { id: first.id, a: start, b: finish, bends: path.slice(1, -1).map(({ x, y }) => [x, y]) };
}
