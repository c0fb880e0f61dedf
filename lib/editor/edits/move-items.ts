import { pinPlacesOf } from '@/lib/document/geometry/pin-place';
import { pointKey, samePoint, type Point } from '@/lib/document/geometry/point';
import { endPlace, indexOf } from '@/lib/document/geometry/sheet-index';
import type { PartRecord, Sheet, WireEnd, WireRecord } from '@/lib/document/records';
import type { NewId } from './edit';
import { movedSet, type MovedSet } from './moved-set';
import { tidyWiring } from './tidy-wiring';

/** How a move changes places and parts: shifting, turning and mirroring are all of this kind. */
export interface Motion {
  point(point: Point): Point;
  part(part: PartRecord): PartRecord;
}

export const shiftBy = (dx: number, dy: number): Motion => ({
  point: ({ x, y }) => ({ x: x + dx, y: y + dy }),
  part: (part) => ({ ...part, x: part.x + dx, y: part.y + dy }),
});

type Bend = WireRecord['bends'][number];

/**
 * Moves parts and junctions with everything that hangs on them alone. Wires to what stays keep a person's corners, the
 * one next to a moved end following it; a pin that touched another stays joined to it by a new wire.
 */
export function moveItems(sheet: Sheet, ids: ReadonlySet<string>, motion: Motion, newId: NewId): Sheet {
  const moved = movedSet(sheet, ids);
  if (moved.parts.size === 0 && moved.junctions.size === 0) return sheet;
  const parts = sheet.parts.map((part) => (moved.parts.has(part.id) ? motion.part(part) : part));
  const junctions = sheet.junctions.map((junction) => (moved.junctions.has(junction.id) ? { ...junction, ...motion.point(junction) } : junction));
  const after = { ...sheet, parts, junctions };
  const wires = sheet.wires.map((wire) => followEnds(sheet, after, wire, moved, motion));
  return tidyWiring({ ...after, wires: [...wires, ...bridges(sheet, after, moved, newId)] });
}

function followEnds(before: Sheet, after: Sheet, wire: WireRecord, moved: MovedSet, motion: Motion): WireRecord {
  const [a, b] = [moved.has(wire.a), moved.has(wire.b)];
  if ((!a && !b) || wire.bends.length === 0) return wire;
  if (a && b) return { ...wire, bends: wire.bends.map(([x, y]): Bend => { const at = motion.point({ x, y }); return [at.x, at.y]; }) };
  const end = a ? wire.a : wire.b;
  const bends = a ? [...wire.bends] : [...wire.bends].reverse();
  const was = endPlace(indexOf(before), end);
  const is = endPlace(indexOf(after), end);
  const [x, y] = bends[0] as Bend;
  if (!was || !is || (was.x !== x && was.y !== y)) return wire;
  bends[0] = [was.x === x ? is.x : x, was.y === y ? is.y : y];
  return { ...wire, bends: a ? bends : bends.reverse() };
}

/** Wires for pins that touched something that stays and do so no longer. */
function bridges(before: Sheet, after: Sheet, moved: MovedSet, newId: NewId): readonly WireRecord[] {
  const staying = new Map<string, WireEnd>();
  for (const part of before.parts) {
    if (!moved.parts.has(part.id)) for (const pin of pinPlacesOf(part)) staying.set(pointKey(pin), { at: 'pin', part: part.id, pin: pin.pin });
  }
  const wires: WireRecord[] = [];
  const index = indexOf(after);
  for (const part of before.parts) {
    if (!moved.parts.has(part.id)) continue;
    for (const pin of pinPlacesOf(part)) {
      const other = staying.get(pointKey(pin));
      const end: WireEnd = { at: 'pin', part: part.id, pin: pin.pin };
      const from = endPlace(index, end);
      if (other && from && !samePoint(from, pin)) wires.push({ id: newId(), a: end, b: other, bends: [] });
    }
  }
  return wires;
}
