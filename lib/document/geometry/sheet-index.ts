import type { JunctionRecord, PartRecord, Sheet, WireEnd, WireRecord } from '../records';
import { pinPlaceOf, pinPlacesOf } from './pin-place';
import type { Point } from './point';

/** Look-ups into one sheet. Sheets are immutable, so one index serves every reader of the same sheet. */
export interface SheetIndex {
  readonly part: ReadonlyMap<string, PartRecord>;
  readonly wire: ReadonlyMap<string, WireRecord>;
  readonly junction: ReadonlyMap<string, JunctionRecord>;
  /** Wires that end at a pin (`pin:<part>:<pin>`) or a junction (`junction:<id>`). */
  readonly wiresAt: ReadonlyMap<string, readonly WireRecord[]>;
}

export const endKey = (end: WireEnd): string => end.at === 'pin' ? `pin:${end.part}:${end.pin}` : `junction:${end.junction}`;

const cache = new WeakMap<Sheet, SheetIndex>();

export function indexOf(sheet: Sheet): SheetIndex {
  const known = cache.get(sheet);
  if (known) return known;
  const wiresAt = new Map<string, WireRecord[]>();
  for (const wire of sheet.wires) {
    for (const key of [endKey(wire.a), endKey(wire.b)]) {
      const list = wiresAt.get(key);
      if (list) list.push(wire); else wiresAt.set(key, [wire]);
    }
  }
  const index: SheetIndex = {
    part: new Map(sheet.parts.map((part) => [part.id, part])),
    wire: new Map(sheet.wires.map((wire) => [wire.id, wire])),
    junction: new Map(sheet.junctions.map((junction) => [junction.id, junction])),
    wiresAt,
  };
  cache.set(sheet, index);
  return index;
}

/** Where a wire's end stands, with the way it leaves a pin (a mark with one pin has none); undefined when the end is missing. */
export function endPlace(index: SheetIndex, end: WireEnd): (Point & { readonly out?: Point }) | undefined {
  if (end.at === 'junction') return index.junction.get(end.junction);
  const part = index.part.get(end.part);
  if (!part) return undefined;
  const place = pinPlaceOf(part, end.pin);
  return place && pinPlacesOf(part).length === 1 ? { x: place.x, y: place.y } : place;
}
