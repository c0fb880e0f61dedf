import { pinPlaceOf, pinPlacesOf } from '@/lib/document/geometry/pin-place';
import { samePoint } from '@/lib/document/geometry/point';
import { endKey, indexOf } from '@/lib/document/geometry/sheet-index';
import { sheetToNetlist } from '@/lib/document/nets/sheet-to-netlist';
import type { Sheet, WireEnd } from '@/lib/document/records';
import { tidyWiring } from '../edits/tidy-wiring';
import type { NewId } from '../edits/edit';
import { joinToNet } from './join-to-net';
import { netOfPin, type PinName } from './named-net';

const markKinds = new Set(['zero-volt', 'net-name']);

/**
 * Takes one pin off its net. What else met at the pin is joined to its net again; null when another part's pin stands
 * exactly there, so that only moving one of them would part them.
 */
export function detachPin(sheet: Sheet, { part: partId, pin: pinName }: PinName, newId: NewId): Sheet | null {
  const index = indexOf(sheet);
  const part = index.part.get(partId);
  const place = part && pinPlaceOf(part, pinName);
  if (!place) return null;
  const touching = sheet.parts.filter((other) => other.id !== partId && pinPlacesOf(other).some((pin) => samePoint(pin, place)));
  if (touching.some((other) => !markKinds.has(other.kind))) return null;
  const here: WireEnd = { at: 'pin', part: partId, pin: pinName };
  const keys = new Set([endKey(here), ...touching.map((mark) => endKey({ at: 'pin', part: mark.id, pin: '1' }))]);
  const bare = tidyWiring({
    ...sheet, parts: sheet.parts.filter((other) => !touching.includes(other)),
    wires: sheet.wires.filter((wire) => !keys.has(endKey(wire.a)) && !keys.has(endKey(wire.b))),
  });
  return rejoin(bare, sheet, { part: partId, pin: pinName }, touching, newId);
}

/** Brings together again what was one net before, but for the pin that left, and puts the net's name back. */
function rejoin(bare: Sheet, before: Sheet, left: PinName, marks: Sheet['parts'], newId: NewId): Sheet {
  const netlist = sheetToNetlist(before);
  const net = netlist.parts.find((one) => one.id === left.part)?.pins[left.pin];
  const members: PinName[] = netlist.parts.flatMap((one) => Object.entries(one.pins)
    .filter(([pin, other]) => other === net && !(one.id === left.part && pin === left.pin)).map(([pin]) => ({ part: one.id, pin })));
  const [first] = members;
  if (!first) return bare;
  let current = bare;
  for (const mark of marks) {
    const place = mark.kind === 'net-name' ? pinPlaceOf(indexOf(current).part.get(first.part) as Sheet['parts'][number], first.pin) : undefined;
    if (place) current = { ...current, parts: [...current.parts, { ...mark, x: place.x, y: place.y }] };
  }
  for (const member of members) {
    const home = { zero: net === '0', pins: [first] };
    if (netOfPin(current, member) !== (home.zero ? '0' : netOfPin(current, first))) current = joinToNet(current, member, home, newId);
  }
  return current;
}
