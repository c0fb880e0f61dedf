import { tidyPath } from '../geometry/corners';
import type { JunctionRecord, WireEnd, WireRecord } from '../records';
import { pointOf, type Cell } from './track-grid';

export interface Traced {
  readonly wires: readonly WireRecord[];
  readonly junctions: readonly JunctionRecord[];
}

/**
 * Turns grid lines of one tree into wires: pins and every point where three lines meet are ends, all else is a run
 * between them. `pinAt` gives the pin that stands on a cell; `newId` names what is made.
 */
export function traceWires(
  paths: readonly (readonly Cell[])[], pinAt: ReadonlyMap<Cell, WireEnd>, newId: (kind: 'wire' | 'junction') => string,
): Traced {
  const neighbours = new Map<Cell, Set<Cell>>();
  const link = (a: Cell, b: Cell) => {
    const set = neighbours.get(a) ?? new Set<Cell>();
    set.add(b);
    neighbours.set(a, set);
  };
  for (const path of paths) {
    path.slice(1).forEach((cell, index) => {
      link(path[index] as Cell, cell);
      link(cell, path[index] as Cell);
    });
  }
  const ends = new Map<Cell, WireEnd>();
  const junctions: JunctionRecord[] = [];
  for (const [cell, next] of [...neighbours].sort(([a], [b]) => a - b)) {
    const pin = pinAt.get(cell);
    if (pin) ends.set(cell, pin);
    else if (next.size !== 2) {
      const junction = { id: newId('junction'), ...pointOf(cell) };
      junctions.push(junction);
      ends.set(cell, { at: 'junction', junction: junction.id });
    }
  }
  const wires: WireRecord[] = [];
  const walked = new Set<string>();
  for (const [start, a] of ends) {
    for (const first of [...(neighbours.get(start) ?? [])].sort((x, y) => x - y)) {
      if (walked.has(`${start} ${first}`)) continue;
      const cells = [start, first];
      for (let cell = first, before = start; !ends.has(cell);) {
        const next = [...(neighbours.get(cell) ?? [])].find((other) => other !== before) as Cell;
        before = cell;
        cell = next;
        cells.push(cell);
      }
      const last = cells.at(-1) as Cell;
      walked.add(`${start} ${first}`).add(`${last} ${cells.at(-2)}`);
      const corners = tidyPath(cells.map(pointOf)).slice(1, -1);
      wires.push({ id: newId('wire'), a, b: ends.get(last) as WireEnd, bends: corners.map(({ x, y }) => [x, y] as [number, number]) });
    }
  }
  return { wires, junctions };
}
