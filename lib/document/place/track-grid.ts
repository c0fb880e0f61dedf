import type { Box, Point } from '../geometry/point';
import { gridUnit } from '../records';

/** A grid point as one number. Coordinates reach ±20,000 units, so 12 bits each side suffice. */
export type Cell = number;
const stride = 8_192;
const middle = 4_096;

export const cellOf = (point: Point): Cell =>
  (Math.round(point.x / gridUnit) + middle) * stride + Math.round(point.y / gridUnit) + middle;

export const pointOf = (cell: Cell): Point => ({
  x: (Math.floor(cell / stride) - middle) * gridUnit + 0, y: ((cell % stride) - middle) * gridUnit + 0,
});

export type Direction = 'left' | 'right' | 'up' | 'down';
export const directions: readonly Direction[] = ['right', 'down', 'left', 'up'];
export const stepOf: Readonly<Record<Direction, number>> = { left: -stride, right: stride, up: -1, down: 1 };
export const isLevel = (direction: Direction): boolean => direction === 'left' || direction === 'right';

/** What stands on the grid while lines are laid: bodies, pins and the lines of every net so far. */
export class TrackGrid {
  private readonly bodies = new Set<Cell>();
  private readonly near = new Set<Cell>();
  /** Net that owns a pin, corner, junction or line end: no other net may touch it. */
  private readonly solid = new Map<Cell, string>();
  private readonly level = new Map<Cell, string>();
  private readonly upright = new Map<Cell, string>();

  addBody(box: Box): void {
    for (let x = Math.ceil(box.left / gridUnit) - 1; x <= Math.floor(box.right / gridUnit) + 1; x += 1) {
      for (let y = Math.ceil(box.top / gridUnit) - 1; y <= Math.floor(box.bottom / gridUnit) + 1; y += 1) {
        const point = { x: x * gridUnit, y: y * gridUnit };
        const inside = point.x >= box.left && point.x <= box.right && point.y >= box.top && point.y <= box.bottom;
        (inside ? this.bodies : this.near).add(cellOf(point));
      }
    }
  }

  addPin(point: Point, net: string): void {
    this.solid.set(cellOf(point), net);
  }

  addLine(path: readonly Cell[], net: string): void {
    path.forEach((cell, index) => {
      const before = path[index - 1];
      const after = path[index + 1];
      if (before === undefined || after === undefined || cell - before !== after - cell) this.solid.set(cell, net);
      else (Math.abs(after - cell) === stride ? this.level : this.upright).set(cell, net);
    });
  }

  /** Extra cost of a step of `net` onto `cell`, or null when it may not go there. `turns` is true when the line bends or ends there. */
  cost(cell: Cell, net: string, level: boolean, turns: boolean): number | null {
    const owner = this.solid.get(cell);
    if (owner !== undefined && owner !== net) return null;
    if (this.bodies.has(cell) && owner !== net) return null;
    const along = (level ? this.level : this.upright).get(cell);
    if (along !== undefined && along !== net) return null;
    const across = (level ? this.upright : this.level).get(cell);
    if (across !== undefined && across !== net) return turns ? null : 3;
    return this.near.has(cell) ? 1 : 0;
  }
}
