import { pinPlacesOf } from '@/lib/document/geometry/pin-place';
import { samePoint, type Point } from '@/lib/document/geometry/point';
import { indexOf } from '@/lib/document/geometry/sheet-index';
import { wirePath } from '@/lib/document/geometry/wire-path';
import type { Sheet, WireEnd } from '@/lib/document/records';
import type { NewId } from './edit';
import { segmentAt, splitWire } from './split-wire';

/** The end that stands at a place: a pin before a junction; undefined where there is neither. */
export function endAt(sheet: Sheet, point: Point): WireEnd | undefined {
  for (const part of sheet.parts) {
    const pin = pinPlacesOf(part).find((place) => samePoint(place, point));
    if (pin) return { at: 'pin', part: part.id, pin: pin.pin };
  }
  const junction = sheet.junctions.find((other) => samePoint(other, point));
  return junction && { at: 'junction', junction: junction.id };
}

export function wireThrough(sheet: Sheet, point: Point, not: (wire: Sheet['wires'][number]) => boolean = () => false): string | undefined {
  const index = indexOf(sheet);
  return sheet.wires.find((wire) => !not(wire) && segmentAt(wirePath(index, wire), point) >= 0)?.id;
}

/** An end for a wire at a place: the pin or junction there, a new junction in the wire that runs through, or a loose end. */
export function makeEndAt(sheet: Sheet, point: Point, newId: NewId): { readonly sheet: Sheet; readonly end: WireEnd } {
  const there = endAt(sheet, point);
  if (there) return { sheet, end: there };
  const junction = { id: newId(), x: point.x, y: point.y };
  const end: WireEnd = { at: 'junction', junction: junction.id };
  const withJunction = { ...sheet, junctions: [...sheet.junctions, junction] };
  const through = wireThrough(sheet, point);
  return { sheet: through === undefined ? withJunction : splitWire(withJunction, through, point, end, newId), end };
}
