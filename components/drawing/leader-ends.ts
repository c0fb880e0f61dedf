import type { MarginAnchor } from '@/components/margin/sheet-geometry';
import { partBoxOf, pinPlaceOf, pinPlacesOf } from '@/lib/document/geometry/pin-place';
import type { Point } from '@/lib/document/geometry/point';
import { indexOf } from '@/lib/document/geometry/sheet-index';
import { wirePath } from '@/lib/document/geometry/wire-path';
import { sheetToNetlist } from '@/lib/document/nets/sheet-to-netlist';
import type { PartRecord, Sheet } from '@/lib/document/records';
import { isTransistor } from '@/lib/netlist/circuit/part-nature';
import { netOfLines } from './hot-wires';

/** Places on a symbol's outline and leads where a leader may end, the best first; several, so that one is clear of words. */
function endsOfPart(part: PartRecord): readonly Point[] {
  const box = partBoxOf(part);
  const middle = (box.top + box.bottom) / 2;
  const centre = (box.left + box.right) / 2;
  const pins = pinPlacesOf(part);
  if (pins.length === 1) return [{ x: box.right, y: middle }, { x: centre, y: box.top }, { x: box.left, y: middle }, { x: part.x, y: part.y }];
  if (pins.length > 0 && pins.every((pin) => pin.out.y !== 0)) {
    const lead = (box.bottom - box.top) / 2 - 9;
    return [
      { x: box.right, y: middle }, { x: centre, y: middle + lead }, { x: centre, y: middle - lead },
      { x: box.left, y: middle }, { x: box.right, y: middle + 8 }, { x: box.right, y: middle - 8 },
    ];
  }
  if (pins.length > 0 && pins.every((pin) => pin.out.x !== 0)) {
    const lead = (box.right - box.left) / 2 - 8;
    return [{ x: centre, y: box.bottom }, { x: centre, y: box.top }, { x: centre + lead, y: middle }, { x: centre - lead, y: middle }];
  }
  return [{ x: box.right, y: middle }, ...pins.map((pin) => ({ x: pin.x - pin.out.x * 8, y: pin.y - pin.out.y * 8 }))];
}

function pathsOfNet(sheet: Sheet, name: string): readonly (readonly Point[])[] {
  const index = indexOf(sheet);
  const nets = netOfLines(sheet);
  return sheet.wires.filter((wire) => nets.get(wire.id) === name).map((wire) => wirePath(index, wire));
}

/** Points of a net's wires beside the pin that a transistor among `refs` has on it, the best first; none without such a pin. */
function endsAtTransistor(sheet: Sheet, net: string, refs: readonly string[]): { readonly ends: readonly Point[]; readonly words: string } | null {
  const listed = sheetToNetlist(sheet).parts.find((part) => isTransistor(part) && refs.includes(part.ref) && Object.values(part.pins).includes(net));
  const part = sheet.parts.find((one) => one.id === listed?.id);
  const [pin] = Object.entries(listed?.pins ?? {}).find(([, name]) => name === net) ?? [];
  const place = part && pin !== undefined ? pinPlaceOf(part, pin) : undefined;
  if (!part || !place) return null;
  const away = (point: Point) => Math.abs(point.x - place.x) + Math.abs(point.y - place.y);
  const along = pathsOfNet(sheet, net).flatMap((path) => path.slice(1).flatMap((b, at) => {
    const a = path[at] ?? b;
    const steps = Math.max(1, Math.round((Math.abs(b.x - a.x) + Math.abs(b.y - a.y)) / 10));
    return Array.from({ length: steps + 1 }, (_, step) => ({ x: a.x + ((b.x - a.x) * step) / steps, y: a.y + ((b.y - a.y) * step) / steps }));
  }));
  const near = along.filter((point) => away(point) <= 40).sort((a, b) => Math.abs(away(a) - 20) - Math.abs(away(b) - 20)).slice(0, 5);
  return { ends: near.length > 0 ? near : [place], words: `${part.ref}:${place.pin}` };
}

function endsOfNet(sheet: Sheet, name: string): readonly Point[] {
  const paths = pathsOfNet(sheet, name);
  const middles = paths.flatMap((path) => path.slice(1).map((b, at) => ({ x: (b.x + (path[at]?.x ?? b.x)) / 2, y: (b.y + (path[at]?.y ?? b.y)) / 2 })));
  return middles.sort((a, b) => b.x - a.x).slice(0, 6);
}

/** Where leaders to an anchor may end, in sheet units, the best first, and what it is called; null when it is not on the sheet. */
export function leaderEnds(sheet: Sheet, anchor: MarginAnchor): { readonly ends: readonly Point[]; readonly words: string } | null {
  switch (anchor.kind) {
    case 'spot': return { ends: [{ x: anchor.x, y: anchor.y }], words: '' };
    case 'net': {
      const ends = endsOfNet(sheet, anchor.name);
      return ends.length === 0 ? null : { ends, words: `net ${anchor.name}` };
    }
    default: {
      const atTransistor = anchor.kind === 'ref' && anchor.on ? endsAtTransistor(sheet, anchor.on.net, anchor.on.refs) : null;
      if (atTransistor) return atTransistor;
      const part = sheet.parts.find((one) => (anchor.kind === 'part' ? one.id === anchor.id : one.ref === anchor.ref));
      return part ? { ends: endsOfPart(part), words: part.ref || 'a mark' } : null;
    }
  }
}
