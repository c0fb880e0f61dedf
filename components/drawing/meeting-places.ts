import { pinPlacesOf } from '@/lib/document/geometry/pin-place';
import { pointKey } from '@/lib/document/geometry/point';
import { endKey, indexOf } from '@/lib/document/geometry/sheet-index';
import type { Sheet } from '@/lib/document/records';

const cache = new WeakMap<Sheet, ReadonlySet<string>>();

/**
 * Places where three conductors or more meet, as `x,y`: each has a dot. Wire ends count, and the leads of parts; a net
 * name is no conductor.
 */
export function meetingPlaces(sheet: Sheet): ReadonlySet<string> {
  const known = cache.get(sheet);
  if (known) return known;
  const { wiresAt } = indexOf(sheet);
  const conductors = new Map<string, number>();
  const add = (place: string, count: number) => conductors.set(place, (conductors.get(place) ?? 0) + count);
  for (const junction of sheet.junctions) add(pointKey(junction), wiresAt.get(`junction:${junction.id}`)?.length ?? 0);
  for (const part of sheet.parts) {
    for (const pin of pinPlacesOf(part)) {
      const wires = wiresAt.get(endKey({ at: 'pin', part: part.id, pin: pin.pin }))?.length ?? 0;
      add(pointKey(pin), wires + (part.kind === 'net-name' ? 0 : 1));
    }
  }
  const places = new Set([...conductors].filter(([, count]) => count > 2).map(([place]) => place));
  cache.set(sheet, places);
  return places;
}
