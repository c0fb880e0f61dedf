import { boxHolds, growBox, type Box, type Point } from '@/lib/document/geometry/point';
import { partBoxOf, pinPlacesOf } from '@/lib/document/geometry/pin-place';
import { indexOf } from '@/lib/document/geometry/sheet-index';
import { wirePath } from '@/lib/document/geometry/wire-path';
import type { Sheet } from '@/lib/document/records';

/** What stands at a place on the sheet. */
export type Hit =
  | { readonly on: 'pin'; readonly part: string; readonly pin: string; readonly at: Point }
  | { readonly on: 'junction'; readonly junction: string; readonly at: Point }
  | { readonly on: 'corner'; readonly wire: string; readonly corner: number; readonly at: Point }
  | { readonly on: 'wire'; readonly wire: string; readonly segment: number; readonly at: Point }
  | { readonly on: 'part'; readonly part: string; readonly at: Point }
  | { readonly on: 'nothing'; readonly at: Point };

const near = (a: Point, b: Point, reach: number) => Math.hypot(a.x - b.x, a.y - b.y) <= reach;

function distanceToSegment(point: Point, a: Point, b: Point): number {
  const x = Math.min(Math.max(point.x, Math.min(a.x, b.x)), Math.max(a.x, b.x));
  const y = Math.min(Math.max(point.y, Math.min(a.y, b.y)), Math.max(a.y, b.y));
  return Math.hypot(point.x - x, point.y - y);
}

/** Outline by which a part is taken hold of: small marks are given some room. */
export function gripBoxOf(part: Sheet['parts'][number]): Box {
  const box = partBoxOf(part);
  return growBox(box, Math.max(2, (14 - Math.min(box.right - box.left, box.bottom - box.top)) / 2));
}

/**
 * The topmost thing within `reach` sheet units: pins, then junctions, parts, and wires with the corners of those in `open`
 * (chosen wires show their corners). Places answered are exact, not where the pointer was.
 */
export function hitTest(sheet: Sheet, point: Point, reach: number, open: ReadonlySet<string> = new Set()): Hit {
  for (const part of sheet.parts) {
    const box = partBoxOf(part);
    if (!boxHolds(growBox(box, reach), point)) continue;
    const pin = pinPlacesOf(part).find((place) => near(place, point, reach));
    if (pin) return { on: 'pin', part: part.id, pin: pin.pin, at: { x: pin.x, y: pin.y } };
  }
  const junction = sheet.junctions.find((other) => near(other, point, reach));
  if (junction) return { on: 'junction', junction: junction.id, at: { x: junction.x, y: junction.y } };
  const index = indexOf(sheet);
  for (const id of open) {
    const wire = index.wire.get(id);
    const corner = wire ? wirePath(index, wire).findIndex((at, place, path) => place > 0 && place < path.length - 1 && near(at, point, reach)) : -1;
    if (wire && corner > 0) return { on: 'corner', wire: id, corner, at: wirePath(index, wire)[corner] as Point };
  }
  for (let place = sheet.parts.length - 1; place >= 0; place -= 1) {
    const part = sheet.parts[place];
    if (part && boxHolds(gripBoxOf(part), point)) return { on: 'part', part: part.id, at: { x: part.x, y: part.y } };
  }
  for (const wire of sheet.wires) {
    const path = wirePath(index, wire);
    for (let segment = 0; segment < path.length - 1; segment += 1) {
      const [a, b] = [path[segment] as Point, path[segment + 1] as Point];
      if (distanceToSegment(point, a, b) > reach) continue;
      const at = a.x === b.x ? { x: a.x, y: point.y } : { x: point.x, y: a.y };
      return { on: 'wire', wire: wire.id, segment, at };
    }
  }
  return { on: 'nothing', at: point };
}

/** Everything wholly inside a box: parts, wires and junctions. */
export function itemsInside(sheet: Sheet, box: Box): ReadonlySet<string> {
  const index = indexOf(sheet);
  const found = new Set<string>();
  for (const part of sheet.parts) {
    const outline = partBoxOf(part);
    if (boxHolds(box, { x: outline.left, y: outline.top }) && boxHolds(box, { x: outline.right, y: outline.bottom })) found.add(part.id);
  }
  for (const wire of sheet.wires) if (wirePath(index, wire).every((corner) => boxHolds(box, corner))) found.add(wire.id);
  for (const junction of sheet.junctions) if (boxHolds(box, junction)) found.add(junction.id);
  return found;
}
