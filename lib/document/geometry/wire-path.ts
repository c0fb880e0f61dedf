import type { WireRecord } from '../records';
import { cornersBetween, tidyPath, type Anchor } from './corners';
import type { Point } from './point';
import { endPlace, type SheetIndex } from './sheet-index';

export type WireBends = readonly (readonly [number, number])[];

/**
 * The drawn line of a wire, always at right angles: its ends, the corners a person set, and between them
 * the corners worked out from the way each pin faces.
 */
export function pathBetween(from: Anchor, bends: WireBends, to: Anchor): readonly Point[] {
  const stops: Anchor[] = [from, ...bends.map(([x, y]) => ({ x, y })), to];
  const path: Point[] = [from];
  for (let index = 1; index < stops.length; index += 1) {
    const stop = stops[index] as Anchor;
    path.push(...cornersBetween(stops[index - 1] as Anchor, stop), stop);
  }
  return tidyPath(path);
}

interface KnownPath {
  readonly from: Anchor;
  readonly to: Anchor;
  readonly path: readonly Point[];
}

const cache = new WeakMap<WireRecord, KnownPath>();

const sameAnchor = (a: Anchor, b: Anchor): boolean =>
  a === b || (a.x === b.x && a.y === b.y && a.out?.x === b.out?.x && a.out?.y === b.out?.y);

/** Path of a wire of a sheet; empty when an end is missing. The same array for as long as wire and ends stand still. */
export function wirePath(index: SheetIndex, wire: WireRecord): readonly Point[] {
  const from = endPlace(index, wire.a);
  const to = endPlace(index, wire.b);
  if (!from || !to) return [];
  const known = cache.get(wire);
  if (known && sameAnchor(known.from, from) && sameAnchor(known.to, to)) return known.path;
  const path = pathBetween(from, wire.bends, to);
  cache.set(wire, { from, to, path });
  return path;
}
