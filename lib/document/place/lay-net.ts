import type { PinPlace } from '../geometry/pin-place';
import { gridUnit } from '../records';
import { findTrack } from './find-track';
import { cellOf, type Cell, type Direction, type TrackGrid } from './track-grid';

/** Pins of one net that lines join, with those lines as grid cells. */
export interface Tree {
  readonly pins: PinPlace[];
  readonly cells: Set<Cell>;
  readonly paths: (readonly Cell[])[];
}

/** How many of the nearest trees a pin is tried to be joined to. */
const triedTrees = 2;

export function leavingWay(out: { readonly x: number; readonly y: number }): Direction {
  if (out.x !== 0) return out.x < 0 ? 'left' : 'right';
  return out.y < 0 ? 'up' : 'down';
}

const gap = (tree: Tree, pin: PinPlace): number =>
  Math.min(...tree.pins.map((other) => Math.abs(other.x - pin.x) + Math.abs(other.y - pin.y)));

/**
 * Draws the lines of one net, nearest pins first. Pins that no short enough line reaches start a tree of their own:
 * several trees of one net are joined by its name.
 */
export function layNet(grid: TrackGrid, net: string, pins: readonly PinPlace[], limit: number): readonly Tree[] {
  const trees: Tree[] = [];
  const waiting = [...pins];
  while (waiting.length > 0) {
    let bestIndex = 0;
    let bestGap = Infinity;
    waiting.forEach((pin, index) => {
      const least = trees.length === 0 ? index : Math.min(...trees.map((tree) => gap(tree, pin)));
      if (least < bestGap) {
        bestGap = least;
        bestIndex = index;
      }
    });
    const pin = waiting.splice(bestIndex, 1)[0] as PinPlace;
    const cell = cellOf(pin);
    const touching = trees.find((tree) => tree.cells.has(cell));
    if (touching) {
      touching.pins.push(pin);
      continue;
    }
    const within = trees.map((tree) => ({ tree, far: gap(tree, pin) })).filter(({ far }) => far <= limit * gridUnit);
    const joined = within.sort((a, b) => a.far - b.far).slice(0, triedTrees).some(({ tree }) => {
      const path = findTrack({ grid, net, from: cell, leave: [leavingWay(pin.out)], targets: tree.cells, limit });
      if (!path) return false;
      grid.addLine(path, net);
      path.forEach((step) => tree.cells.add(step));
      grid.addPin({ x: pin.x, y: pin.y }, net);
      tree.paths.push(path);
      tree.pins.push(pin);
      return true;
    });
    if (!joined) trees.push({ pins: [pin], cells: new Set([cell]), paths: [] });
  }
  return trees;
}
