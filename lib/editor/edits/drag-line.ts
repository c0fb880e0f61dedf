import { tidyPath } from '@/lib/document/geometry/corners';
import type { Point } from '@/lib/document/geometry/point';
import { indexOf } from '@/lib/document/geometry/sheet-index';
import { wirePath } from '@/lib/document/geometry/wire-path';
import type { Sheet, WireRecord } from '@/lib/document/records';

const withBends = (sheet: Sheet, wire: WireRecord, path: readonly Point[]): Sheet => {
  const bends = tidyPath(path).slice(1, -1).map(({ x, y }): [number, number] => [x, y]);
  return { ...sheet, wires: sheet.wires.map((other) => (other === wire ? { ...wire, bends } : other)) };
};

/** Shifts one straight run of a wire square to itself, to the line through `to`; its ends stay where they are. */
export function dragSegment(sheet: Sheet, wireId: string, segment: number, to: Point): Sheet {
  const index = indexOf(sheet);
  const wire = index.wire.get(wireId);
  if (!wire) return sheet;
  const path = wirePath(index, wire);
  const [a, b] = [path[segment], path[segment + 1]];
  if (!a || !b) return sheet;
  const upright = a.x === b.x;
  const shifted = (point: Point): Point => (upright ? { x: to.x, y: point.y } : { x: point.x, y: to.y });
  if (upright ? a.x === to.x : a.y === to.y) return sheet;
  const start = segment === 0 ? [a] : [];
  const finish = segment === path.length - 2 ? [b] : [];
  return withBends(sheet, wire, [...path.slice(0, segment), ...start, shifted(a), shifted(b), ...finish, ...path.slice(segment + 2)]);
}

/** Moves one corner of a wire; the runs on both sides follow it and stay at right angles. */
export function dragCorner(sheet: Sheet, wireId: string, corner: number, to: Point): Sheet {
  const index = indexOf(sheet);
  const wire = index.wire.get(wireId);
  if (!wire) return sheet;
  const path = wirePath(index, wire);
  const [before, at, after] = [path[corner - 1], path[corner], path[corner + 1]];
  if (!before || !at || !after || (at.x === to.x && at.y === to.y)) return sheet;
  const arrivesUpright = before.x === at.x;
  const into: Point = arrivesUpright ? { x: to.x, y: before.y } : { x: before.x, y: to.y };
  const outOf: Point = arrivesUpright ? { x: after.x, y: to.y } : { x: to.x, y: after.y };
  const start = corner - 1 === 0 ? [before, into] : [into];
  const finish = corner + 1 === path.length - 1 ? [outOf, after] : [outOf];
  return withBends(sheet, wire, [...path.slice(0, corner - 1), ...start, to, ...finish, ...path.slice(corner + 2)]);
}
