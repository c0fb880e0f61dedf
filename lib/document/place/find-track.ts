import { Heap } from './heap';
import { directions, isLevel, pointOf, stepOf, type Cell, type Direction, type TrackGrid } from './track-grid';
import { gridUnit } from '../records';

export interface TrackRequest {
  readonly grid: TrackGrid;
  readonly net: string;
  readonly from: Cell;
  /** Ways in which the line may leave `from`. */
  readonly leave: readonly Direction[];
  /** Pins and points of the net's lines so far. */
  readonly targets: ReadonlySet<Cell>;
  /** Longest line worth drawing, in grid steps with their penalties; beyond it the net is named instead. */
  readonly limit: number;
}

const bendCost = 4;

interface Stand {
  readonly cell: Cell;
  readonly way: Direction;
  readonly cost: number;
  readonly from: Stand | null;
}

/** Cheapest line from a pin to anything of its net, as grid cells from start to target; null when there is none within the limit. */
export function findTrack({ grid, net, from, leave, targets, limit }: TrackRequest): readonly Cell[] | null {
  const guess = distanceTo(targets);
  const open = new Heap<Stand>();
  const settled = new Set<string>();
  const push = (stand: Stand) => {
    const total = stand.cost + guess(stand.cell);
    if (total <= limit) open.push(total, stand);
  };
  for (const way of leave) push({ cell: from, way, cost: 0, from: null });
  for (let stand = open.pop(); stand; stand = open.pop()) {
    const key = `${stand.cell} ${stand.way}`;
    if (settled.has(key)) continue;
    settled.add(key);
    if (stand.cell !== from && targets.has(stand.cell)) return cellsOf(stand);
    const cell = stand.cell + stepOf[stand.way];
    const arrives = targets.has(cell);
    for (const way of arrives ? [stand.way] : directions) {
      const turns = way !== stand.way;
      if (turns && isLevel(way) === isLevel(stand.way)) continue;
      const extra = grid.cost(cell, net, isLevel(stand.way), turns || arrives);
      if (extra === null) continue;
      push({ cell, way, cost: stand.cost + 1 + extra + (turns ? bendCost : 0), from: stand });
    }
  }
  return null;
}

function cellsOf(last: Stand): readonly Cell[] {
  const cells: Cell[] = [];
  for (let stand: Stand | null = last; stand; stand = stand.from) cells.push(stand.cell);
  return cells.reverse();
}

/** Grid steps to the box round all targets: never more than the true distance. */
function distanceTo(targets: ReadonlySet<Cell>): (cell: Cell) => number {
  const points = [...targets].map(pointOf);
  const left = Math.min(...points.map((point) => point.x));
  const right = Math.max(...points.map((point) => point.x));
  const top = Math.min(...points.map((point) => point.y));
  const bottom = Math.max(...points.map((point) => point.y));
  return (cell) => {
    const { x, y } = pointOf(cell);
    return (Math.max(left - x, 0, x - right) + Math.max(top - y, 0, y - bottom)) / gridUnit;
  };
}
