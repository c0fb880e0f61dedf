import { partBoxOf } from '../geometry/pin-place';
import type { Point } from '../geometry/point';
import { indexOf } from '../geometry/sheet-index';
import { wirePath } from '../geometry/wire-path';
import { drawnNets } from '../nets/drawn-net';
import { gridUnit, type Sheet } from '../records';
import { cellOf, TrackGrid, type Cell } from './track-grid';

export interface SheetTracks {
  readonly grid: TrackGrid;
  /** Cells of each drawn net, in the order of `drawnNets`: its pins, junctions and lines. */
  readonly cells: readonly ReadonlySet<Cell>[];
}

/** Key under which a drawn net stands in the grid. */
export const trackNet = (index: number): string => `net ${index}`;

/** A sheet as obstacles for new lines. */
export function tracksOf(sheet: Sheet): SheetTracks {
  const grid = new TrackGrid();
  const index = indexOf(sheet);
  for (const part of sheet.parts) if (part.kind !== 'net-name') grid.addBody(partBoxOf(part));
  const cells = drawnNets(sheet).map((net, number) => {
    const own = new Set<Cell>();
    const place = (point: Point) => {
      grid.addPin(point, trackNet(number));
      own.add(cellOf(point));
    };
    net.pins.forEach(place);
    net.junctions.forEach((id) => place(index.junction.get(id) as Point));
    for (const id of net.wires) {
      const wire = index.wire.get(id);
      const line = wire ? cellsAlong(wirePath(index, wire)) : [];
      grid.addLine(line, trackNet(number));
      line.forEach((cell) => own.add(cell));
    }
    return own;
  });
  return { grid, cells };
}

/** Every grid point along a path, ends included. */
export function cellsAlong(path: readonly Point[]): readonly Cell[] {
  const cells: Cell[] = path[0] ? [cellOf(path[0])] : [];
  for (let place = 1; place < path.length; place += 1) {
    const [from, to] = [path[place - 1] as Point, path[place] as Point];
    const steps = (Math.abs(to.x - from.x) + Math.abs(to.y - from.y)) / gridUnit;
    for (let step = 1; step <= steps; step += 1) {
      cells.push(cellOf({ x: from.x + ((to.x - from.x) * step) / steps, y: from.y + ((to.y - from.y) * step) / steps }));
    }
  }
  return cells;
}
