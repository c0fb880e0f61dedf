import type { Box, Place } from './sheet-geometry';

export interface Leader {
  /** Leaves the column level, bends once, ends on the target. */
  readonly from: Place;
  readonly bend: Place;
  readonly end: Place;
}

function side(a: Place, b: Place, p: Place): number {
  return (b.x - a.x) * (p.y - a.y) - (b.y - a.y) * (p.x - a.x);
}

function segmentsCross(a: Place, b: Place, c: Place, d: Place): boolean {
  return side(a, b, c) * side(a, b, d) < 0 && side(c, d, a) * side(c, d, b) < 0;
}

/** True when the segment passes through the box. */
export function crossesBox(a: Place, b: Place, box: Box): boolean {
  const inside = (p: Place) => p.x > box.left && p.x < box.right && p.y > box.top && p.y < box.bottom;
  if (inside(a) || inside(b)) return true;
  const corners: readonly Place[] = [
    { x: box.left, y: box.top }, { x: box.right, y: box.top }, { x: box.right, y: box.bottom }, { x: box.left, y: box.bottom },
  ];
  return corners.some((corner, index) => {
    const next = corners[(index + 1) % 4];
    return next !== undefined && segmentsCross(a, b, corner, next);
  });
}

function crossings(leader: Leader, texts: readonly Box[], others: readonly Leader[]): number {
  const { from, bend, end } = leader;
  const text = texts.filter((box) => crossesBox(from, bend, box) || crossesBox(bend, end, box)).length;
  const lines = others.filter((other) =>
    segmentsCross(from, bend, other.bend, other.end) || segmentsCross(bend, end, other.from, other.bend) || segmentsCross(bend, end, other.bend, other.end)).length;
  return text * 4 + lines;
}

const step = 24;

/**
 * Routes one leader from the column at `from` to one of `ends`: level, one bend, then straight. Of all bends on the level
 * run, and all ends, the one that crosses no text wins, then the one that crosses fewest leaders, then the shortest level run
 * over the sheet.
 */
export function routeLeader(from: Place, ends: readonly Place[], texts: readonly Box[], others: readonly Leader[]): Leader | null {
  let best: { readonly leader: Leader; readonly cost: number } | null = null;
  ends.forEach((end, rank) => {
    const nearest = Math.max(end.x + 6, Math.min(end.x + 12, from.x));
    for (let x = from.x - 10; x >= Math.min(nearest, from.x - 10); x -= step) {
      const leader: Leader = { from, bend: { x, y: from.y }, end };
      const slope = Math.abs(end.y - from.y) / Math.max(1, x - end.x);
      const cost = crossings(leader, texts, others) * 1_000 + Math.hypot(x - end.x, from.y - end.y) * 0.1 + (from.x - x) * 0.12 + (slope > 4 ? 40 : 0) + rank * 15;
      if (best === null || cost < best.cost) best = { leader, cost };
    }
  });
  return (best as { readonly leader: Leader } | null)?.leader ?? null;
}
