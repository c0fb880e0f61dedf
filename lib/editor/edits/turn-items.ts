import { snap, type Point } from '@/lib/document/geometry/point';
import { turnedBy } from '@/lib/document/geometry/turn';
import type { PartRecord, Sheet } from '@/lib/document/records';
import type { Motion } from './move-items';

/** Where chosen things are turned about: a single part's origin, else the middle of them all, on the grid. */
export function pivotOf(sheet: Sheet, ids: ReadonlySet<string>): Point {
  const chosen = [...sheet.parts, ...sheet.junctions].filter((item) => ids.has(item.id));
  const xs = chosen.map((item) => item.x);
  const ys = chosen.map((item) => item.y);
  if (chosen.length === 0) return { x: 0, y: 0 };
  return { x: snap((Math.min(...xs) + Math.max(...xs)) / 2), y: snap((Math.min(...ys) + Math.max(...ys)) / 2) };
}

/** A quarter turn about a point, clockwise for 1, against it for -1. */
export function turnAbout(pivot: Point, quarters: 1 | -1): Motion {
  const point = ({ x, y }: Point): Point => ({ x: pivot.x - quarters * (y - pivot.y) + 0, y: pivot.y + quarters * (x - pivot.x) + 0 });
  return { point, part: (part) => ({ ...part, ...point(part), turn: turnedBy(part.turn, quarters) }) };
}

/** Left and right changed over about a point. Mirroring comes before turning, so an upright part turns the other way. */
export function mirrorAbout(pivot: Point): Motion {
  const point = ({ x, y }: Point): Point => ({ x: 2 * pivot.x - x, y });
  const part = (old: PartRecord): PartRecord => ({ ...old, ...point(old), mirror: !old.mirror, turn: turnedBy(0, (360 - old.turn) / 90) });
  return { point, part };
}
