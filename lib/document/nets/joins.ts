import { junctionEnd, pinEnd, type EndKey } from '@/lib/netlist/connectivity/end-key';
import { pinPlacesOf } from '../geometry/pin-place';
import { pointKey, type Point } from '../geometry/point';
import type { Sheet, WireEnd } from '../records';

export type Join = readonly [EndKey, EndKey];

export const endKeyOf = (end: WireEnd): EndKey => (end.at === 'pin' ? pinEnd(end.part, end.pin) : junctionEnd(end.junction));

/**
 * Pairs of ends that are one node: both ends of every wire, and pins and junctions that stand at the same place.
 * A wire that merely crosses another, or passes a pin, joins nothing.
 */
export function joinsOf(sheet: Sheet): readonly Join[] {
  const joins: Join[] = sheet.wires.map((wire) => [endKeyOf(wire.a), endKeyOf(wire.b)]);
  const first = new Map<string, EndKey>();
  const meet = (place: Point, end: EndKey) => {
    const key = pointKey(place);
    const other = first.get(key);
    if (other === undefined) first.set(key, end);
    else joins.push([other, end]);
  };
  for (const part of sheet.parts) for (const pin of pinPlacesOf(part)) meet(pin, pinEnd(part.id, pin.pin));
  for (const junction of sheet.junctions) meet(junction, junctionEnd(junction.id));
  return joins;
}
