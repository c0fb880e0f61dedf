import { pathLength } from '@/lib/document/geometry/corners';
import { onSegment, samePoint, type Point } from '@/lib/document/geometry/point';
import { indexOf } from '@/lib/document/geometry/sheet-index';
import { wirePath } from '@/lib/document/geometry/wire-path';
import type { Sheet, WireEnd, WireRecord } from '@/lib/document/records';
import type { NewId } from './edit';

/** A place on a wire's path and the end that both pieces get there. */
export interface Cut {
  readonly at: Point;
  readonly end: WireEnd;
}

/** Whether a point lies on a path between its ends, and on which segment; -1 when it does not. */
export function segmentAt(path: readonly Point[], point: Point): number {
  if (path.length < 2 || samePoint(path[0] as Point, point) || samePoint(path.at(-1) as Point, point)) return -1;
  return path.findIndex((from, index) => index < path.length - 1 && onSegment(point, from, path[index + 1] as Point));
}

/** Cuts a wire at places of its path; the pieces follow the line as it was drawn. The first keeps the id. */
export function splitWireAt(sheet: Sheet, wireId: string, cuts: readonly Cut[], newId: NewId): Sheet {
  const index = indexOf(sheet);
  const wire = index.wire.get(wireId);
  if (!wire) return sheet;
  const path = wirePath(index, wire);
  const along = cuts.map((cut) => ({ ...cut, segment: segmentAt(path, cut.at) })).filter(({ segment }) => segment >= 0)
    .map((cut) => ({ ...cut, distance: pathLength([...path.slice(0, cut.segment + 1), cut.at]) }))
    .sort((a, b) => a.distance - b.distance);
  if (along.length === 0) return sheet;
  const pieces: WireRecord[] = [];
  let [from, start] = [wire.a, 1];
  for (const { at, end, segment } of [...along, { at: path.at(-1) as Point, end: wire.b, segment: path.length - 2 }]) {
    const corners = path.slice(start, segment + 1).filter((corner) => !samePoint(corner, at));
    const last = along[pieces.length - 1]?.at;
    const bends = corners.filter((corner) => !last || !samePoint(corner, last)).map(({ x, y }): [number, number] => [x, y]);
    pieces.push({ id: pieces.length === 0 ? wire.id : newId(), a: from, b: end, bends });
    [from, start] = [end, segment + 1];
  }
  return { ...sheet, wires: sheet.wires.flatMap((other) => (other === wire ? pieces : [other])) };
}

/** Cuts a wire at one place. */
export const splitWire = (sheet: Sheet, wireId: string, at: Point, end: WireEnd, newId: NewId): Sheet =>
  splitWireAt(sheet, wireId, [{ at, end }], newId);
