import { meetingPlaces } from '@/components/drawing/meeting-places';
import { pinPlacesOf } from '@/lib/document/geometry/pin-place';
import { pointKey } from '@/lib/document/geometry/point';
import { endKey, indexOf } from '@/lib/document/geometry/sheet-index';
import type { Sheet } from '@/lib/document/records';

const cache = new WeakMap<Sheet, ReadonlyMap<string, string>>();

/**
 * State of each pin of each part as words in the pins' order: `met` where three conductors meet, `joined`, `lone` or
 * `open`. A text, so that it compares by value.
 */
export function pinStates(sheet: Sheet): ReadonlyMap<string, string> {
  const known = cache.get(sheet);
  if (known) return known;
  const { wiresAt } = indexOf(sheet);
  const meeting = meetingPlaces(sheet);
  const standing = new Map<string, number>();
  for (const junction of sheet.junctions) standing.set(pointKey(junction), 1);
  for (const part of sheet.parts) for (const pin of pinPlacesOf(part)) standing.set(pointKey(pin), (standing.get(pointKey(pin)) ?? 0) + 1);
  const states = new Map(sheet.parts.map((part) => [part.id, pinPlacesOf(part).map((pin) => {
    const wired = wiresAt.has(endKey({ at: 'pin', part: part.id, pin: pin.pin }));
    if (meeting.has(pointKey(pin))) return 'met';
    if (wired || (standing.get(pointKey(pin)) ?? 0) > 1) return 'joined';
    return part.leftOpen.includes(pin.pin) ? 'open' : 'lone';
  }).join(' ')]));
  cache.set(sheet, states);
  return states;
}
