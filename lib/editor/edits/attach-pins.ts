import { pinPlacesOf } from '@/lib/document/geometry/pin-place';
import { indexOf } from '@/lib/document/geometry/sheet-index';
import { wirePath } from '@/lib/document/geometry/wire-path';
import type { Sheet, WireEnd } from '@/lib/document/records';
import type { NewId } from './edit';
import { segmentAt, splitWireAt, type Cut } from './split-wire';
import { tidyWiring } from './tidy-wiring';

/**
 * Joins parts to the wires that their pins were dropped on. A wire that two pins of one part lie on is cut: the part
 * stands in line with it, and the piece under its body goes.
 */
export function attachPins(sheet: Sheet, partIds: Iterable<string>, newId: NewId): Sheet {
  let current = sheet;
  for (const id of partIds) {
    const part = current.parts.find((other) => other.id === id);
    if (!part) continue;
    const own = (end: WireEnd) => end.at === 'pin' && end.part === id;
    const index = indexOf(current);
    for (const wire of current.wires) {
      if (own(wire.a) || own(wire.b)) continue;
      const path = wirePath(index, wire);
      const cuts = pinPlacesOf(part).filter((pin) => segmentAt(path, pin) >= 0)
        .map((pin): Cut => ({ at: pin, end: { at: 'pin', part: id, pin: pin.pin } }));
      if (cuts.length === 0) continue;
      const cut = splitWireAt(current, wire.id, cuts, newId);
      const known = new Set(current.wires);
      current = { ...cut, wires: cut.wires.filter((piece) => known.has(piece) || !(own(piece.a) && own(piece.b))) };
    }
  }
  return current === sheet ? sheet : tidyWiring(current);
}
