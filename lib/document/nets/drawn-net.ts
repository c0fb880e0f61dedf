import { pinPlacesOf, type PinPlace } from '../geometry/pin-place';
import { pointKey } from '../geometry/point';
import { endKey } from '../geometry/sheet-index';
import type { Sheet } from '../records';
import { UnionFind } from './union-find';

/** What is joined by lines on the sheet: net names and 0 V symbols still stand for themselves here. */
export interface DrawnNet {
  readonly id: string;
  readonly pins: readonly PinPlace[];
  readonly wires: readonly string[];
  readonly junctions: readonly string[];
}

const cache = new WeakMap<Sheet, readonly DrawnNet[]>();

/**
 * Pins, wires and junctions that belong together: a wire joins its two ends; pins and junctions at the same
 * place join. A wire that merely crosses another, or passes a pin, joins nothing.
 */
export function drawnNets(sheet: Sheet): readonly DrawnNet[] {
  const known = cache.get(sheet);
  if (known) return known;
  const sets = new UnionFind();
  const pins = new Map<string, PinPlace>();
  for (const part of sheet.parts) {
    for (const place of pinPlacesOf(part)) {
      const key = `pin:${part.id}:${place.pin}`;
      pins.set(key, place);
      sets.join(key, `place:${pointKey(place)}`);
    }
  }
  for (const junction of sheet.junctions) sets.join(`junction:${junction.id}`, `place:${pointKey(junction)}`);
  for (const wire of sheet.wires) {
    sets.join(endKey(wire.a), `wire:${wire.id}`);
    sets.join(endKey(wire.b), `wire:${wire.id}`);
  }
  const named = (keys: readonly string[], kind: string) =>
    keys.filter((key) => key.startsWith(`${kind}:`)).map((key) => key.slice(kind.length + 1)).sort();
  const nets = [...sets.sets()].map(([id, keys]) => ({
    id,
    pins: keys.flatMap((key) => pins.get(key) ?? []),
    wires: named(keys, 'wire'),
    junctions: named(keys, 'junction'),
  }));
  nets.sort((a, b) => (a.id < b.id ? -1 : 1));
  cache.set(sheet, nets);
  return nets;
}
