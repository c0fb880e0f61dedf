import { samePoint, snap, type Point } from './point';

/** An end of a line; `out` is the way a pin faces. */
export type Anchor = Point & { readonly out?: Point };

/** How far a line runs straight out of a pin before it turns round a body. */
const stepOut = 20;
const detour = 40;

/** Takes out repeated points and those in the middle of a straight run. */
export function tidyPath(path: readonly Point[]): readonly Point[] {
  const kept: Point[] = [];
  for (const point of path) {
    const last = kept.at(-1);
    if (last && samePoint(last, point)) continue;
    const before = kept.at(-2);
    if (before && last && ((before.x === last.x && last.x === point.x) || (before.y === last.y && last.y === point.y))) kept.pop();
    kept.push({ x: point.x, y: point.y });
  }
  return kept;
}

export function pathLength(path: readonly Point[]): number {
  return path.slice(1).reduce((sum, point, index) => {
    const from = path[index] as Point;
    return sum + Math.abs(point.x - from.x) + Math.abs(point.y - from.y);
  }, 0);
}

/** 1 when the step from `a` to `b` goes the way `out` points, -1 against it, 0 across. */
function along(a: Point | undefined, b: Point | undefined, out: Point): number {
  if (!a || !b) return 0;
  return Math.sign((b.x - a.x) * out.x + (b.y - a.y) * out.y);
}

/** Lower is better: short, few corners, out of a pin the way it faces and never back through its body. */
function costOf(path: readonly Point[], from: Anchor, to: Anchor): number {
  const leaving = from.out ? along(path[0], path[1], from.out) : 1;
  const arriving = to.out ? along(path.at(-1), path.at(-2), to.out) : 1;
  const against = (leaving < 0 ? 1_000 : 0) + (arriving < 0 ? 1_000 : 0);
  const across = (leaving === 0 ? 45 : 0) + (arriving === 0 ? 45 : 0);
  return pathLength(path) + (path.length - 2) * 20 + against + across;
}

/**
 * Corners between two places, at right angles and on the grid. The same two places always give the same line.
 */
export function cornersBetween(from: Anchor, to: Anchor): readonly Point[] {
  const straight = from.x === to.x || from.y === to.y;
  if (straight && costOf([from, to], from, to) < 1_000) return [];
  const xs = [snap((from.x + to.x) / 2), from.x - stepOut, from.x + stepOut, to.x - stepOut, to.x + stepOut];
  const ys = [snap((from.y + to.y) / 2), from.y - stepOut, from.y + stepOut, to.y - stepOut, to.y + stepOut];
  const top = Math.min(from.y, to.y) - detour;
  const bottom = Math.max(from.y, to.y) + detour;
  const left = Math.min(from.x, to.x) - detour;
  const right = Math.max(from.x, to.x) + detour;
  const out = (anchor: Anchor): Point => ({
    x: anchor.x + (anchor.out?.x ?? 0) * stepOut, y: anchor.y + (anchor.out?.y ?? 0) * stepOut,
  });
  const a = out(from);
  const b = out(to);
  const candidates: (readonly Point[])[] = [
    [{ x: to.x, y: from.y }], [{ x: from.x, y: to.y }],
    ...xs.map((x) => [{ x, y: from.y }, { x, y: to.y }]),
    ...ys.map((y) => [{ x: from.x, y }, { x: to.x, y }]),
    [a, { x: a.x, y: b.y }, b], [a, { x: b.x, y: a.y }, b],
    ...[top, bottom].map((y) => [a, { x: a.x, y }, { x: b.x, y }, b]),
    ...[left, right].map((x) => [a, { x, y: a.y }, { x, y: b.y }, b]),
  ];
  let best: readonly Point[] = [];
  let bestCost = Infinity;
  for (const corners of candidates) {
    const path = tidyPath([from, ...corners, to]);
    const cost = costOf(path, from, to);
    if (cost < bestCost) {
      best = path;
      bestCost = cost;
    }
  }
  return best.slice(1, -1);
}
