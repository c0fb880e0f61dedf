import type { Box, Obstacles, Place } from './sheet-geometry';

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

/** Texts that the level run at height `y` between two places would cross. */
function levelTexts(texts: readonly Box[], y: number, left: number, right: number): number {
  let count = 0;
  for (const box of texts) if (y > box.top && y < box.bottom && box.right > left && box.left < right) count += 1;
  return count;
}

function slantTexts(texts: readonly Box[], a: Place, b: Place): number {
  const left = Math.min(a.x, b.x);
  const right = Math.max(a.x, b.x);
  const top = Math.min(a.y, b.y);
  const bottom = Math.max(a.y, b.y);
  let count = 0;
  for (const box of texts) {
    if (box.right < left || box.left > right || box.bottom < top || box.top > bottom) continue;
    if (crossesBox(a, b, box)) count += 1;
  }
  return count;
}

function crossedLeaders(leader: Leader, others: readonly Leader[]): number {
  const { from, bend, end } = leader;
  return others.filter((other) =>
    segmentsCross(from, bend, other.bend, other.end) || segmentsCross(bend, end, other.from, other.bend) || segmentsCross(bend, end, other.bend, other.end)).length;
}

const step = 20;

export interface RoutedLeader {
  readonly leader: Leader;
  /** Texts that it crosses; 0 wherever there is a way round. */
  readonly texts: number;
  /** Symbols that it crosses, and level wires that it runs along. */
  readonly obstacles: number;
}

const nothing: Obstacles = { symbols: [], levelWires: [] };

/**
 * Routes one leader from the column at `from` to one of `ends`: level, one bend, then straight. Of all bends on the level
 * run, and all ends, the one that crosses no text wins, then the one that crosses fewest leaders and obstacles, then the
 * shortest one.
 */
export function routeLeader(from: Place, ends: readonly Place[], texts: readonly Box[], others: readonly Leader[], { symbols, levelWires }: Obstacles = nothing): RoutedLeader | null {
  let best: (RoutedLeader & { readonly cost: number }) | null = null;
  for (const [rank, end] of ends.entries()) {
    const nearest = Math.min(from.x - 10, end.x + 10);
    for (let x = from.x - 10; x >= nearest; x -= step) {
      const slope = Math.abs(end.y - from.y) / Math.max(1, x - end.x);
      const length = Math.hypot(x - end.x, from.y - end.y) * 0.1 + (from.x - x) * 0.12 + (slope > 4 ? 40 : 0) + rank * 15;
      if (best !== null && length >= best.cost) continue;
      const bend = { x, y: from.y };
      const crossed = levelTexts(texts, from.y, x, from.x) + slantTexts(texts, bend, end);
      const cost = length + crossed * 4_000;
      if (best !== null && cost >= best.cost) continue;
      const leader: Leader = { from, bend, end };
      const obstacles = levelTexts(symbols, from.y, x, from.x) + slantTexts(symbols, bend, end) + levelTexts(levelWires, from.y, x, from.x);
      const full = cost + crossedLeaders(leader, others) * 1_000 + obstacles * 300;
      if (best === null || full < best.cost) best = { leader, texts: crossed, obstacles, cost: full };
    }
  }
  return best;
}
