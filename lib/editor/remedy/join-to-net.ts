import { tidyPath } from '@/lib/document/geometry/corners';
import { pinPlaceOf, type PinPlace } from '@/lib/document/geometry/pin-place';
import { indexOf } from '@/lib/document/geometry/sheet-index';
import type { Turn } from '@/lib/document/geometry/turn';
import { findTrack } from '@/lib/document/place/find-track';
import { leavingWay } from '@/lib/document/place/lay-net';
import { tracksOf, trackNet } from '@/lib/document/place/sheet-tracks';
import { cellOf, pointOf, type Cell } from '@/lib/document/place/track-grid';
import type { PartRecord, Sheet } from '@/lib/document/records';
import { addWire } from '../edits/add-wire';
import type { NewId } from '../edits/edit';
import { drawnNetsNamed, nameOfHeld, netOfPin, type HeldNet, type PinName } from './named-net';

/** Longest line drawn for a proposed change; beyond it the net's name is put at the pin. In grid steps with penalties. */
const lineLimit = 90;

const turnOf = (drawn: { readonly x: number; readonly y: number }, pin: PinPlace): Turn =>
  ((Math.round(((Math.atan2(pin.out.y, pin.out.x) - Math.atan2(drawn.y, drawn.x)) * 180) / Math.PI / 90) * 90 + 720) % 360) as Turn;

function withMark(sheet: Sheet, kind: 'zero-volt' | 'net-name', pin: PinPlace, facts: PartRecord['facts'], newId: NewId): Sheet {
  const turn = turnOf(kind === 'zero-volt' ? { x: 0, y: 1 } : { x: 1, y: 0 }, pin);
  const mark: PartRecord = { id: newId(), ref: '', kind, x: pin.x, y: pin.y, turn, mirror: false, facts, origins: {}, leftOpen: [] };
  return { ...sheet, parts: [...sheet.parts, mark] };
}

/** Joins a pin to a net: by a line where a short one can be drawn, for 0 V by its symbol, else by the net's name. */
export function joinToNet(sheet: Sheet, { part: partId, pin: pinName }: PinName, held: HeldNet, newId: NewId): Sheet {
  const part = indexOf(sheet).part.get(partId);
  const pin = part && pinPlaceOf(part, pinName);
  const net = nameOfHeld(sheet, held);
  if (!part || !pin || net === undefined || netOfPin(sheet, { part: partId, pin: pinName }) === net) return sheet;
  if (net === '0') return withMark(sheet, 'zero-volt', pin, {}, newId);
  const { grid, cells } = tracksOf(sheet);
  const drawn = drawnNetsNamed(sheet, net);
  const targets = new Set<Cell>(drawn.flatMap(({ number }) => [...(cells[number] ?? [])]));
  const key = trackNet(drawn[0]?.number ?? -1);
  for (const { number } of drawn) cells[number]?.forEach((cell) => targets.add(cell));
  grid.addPin(pin, key);
  for (const { net: other } of drawn.slice(1)) other.pins.forEach((place) => grid.addPin(place, key));
  const path = targets.size > 0 ? findTrack({ grid, net: key, from: cellOf(pin), leave: [leavingWay(pin.out)], targets, limit: lineLimit }) : null;
  if (path) {
    const corners = tidyPath(path.map(pointOf));
    const bends = corners.slice(1, -1).map(({ x, y }): [number, number] => [x, y]);
    return addWire(sheet, pin, bends, corners.at(-1) ?? pin, newId);
  }
  const named = sheet.parts.some((one) => one.kind === 'net-name' && one.facts.name === net);
  const anchor = drawn[0]?.net.pins[0];
  const withName = named || !anchor ? sheet : withMark(sheet, 'net-name', anchor, { name: net }, newId);
  return withMark(withName, 'net-name', pin, { name: net }, newId);
}
