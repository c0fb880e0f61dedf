import type { WireRecord } from '../records';
import { cornersBetween, tidyPath, type Anchor } from './corners';
import type { Point } from './point';
import { endPlace, type SheetIndex } from './sheet-index';

/**
 * The drawn line of a wire, always at right angles: its ends, the corners a person set, and between them
 * the corners worked out from the way each pin faces.
 */
export function pathBetween(from: Anchor, bends: readonly (readonly [number, number])[], to: Anchor): readonly Point[] {
  const stops: Anchor[] = [from, ...bends.map(([x, y]) => ({ x, y })), to];
  const path: Point[] = [from];
  for (let index = 1; index < stops.length; index += 1) {
    const stop = stops[index] as Anchor;
    path.push(...cornersBetween(stops[index - 1] as Anchor, stop), stop);
  }
  return tidyPath(path);
}

/** Path of a wire of a sheet; empty when an end is missing. */
export function wirePath(index: SheetIndex, wire: WireRecord): readonly Point[] {
  const from = endPlace(index, wire.a);
  const to = endPlace(index, wire.b);
  return from && to ? pathBetween(from, wire.bends, to) : [];
}
