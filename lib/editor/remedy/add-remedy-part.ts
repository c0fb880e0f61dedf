import { kindIds, type KindId } from '@/lib/netlist/kinds/kind-id';
import type { RemedyEdit } from '@/lib/netlist/findings/finding';
import { partBoxOf, pinPlaceOf, pinPlacesOf, type PinPlace } from '@/lib/document/geometry/pin-place';
import { snap, type Box, type Point } from '@/lib/document/geometry/point';
import { indexOf } from '@/lib/document/geometry/sheet-index';
import { wirePath } from '@/lib/document/geometry/wire-path';
import { freePlace } from '@/lib/document/place/free-place';
import { turnedFor } from '@/lib/document/place/orient';
import type { PartRecord, Sheet } from '@/lib/document/records';
import { newPart } from '../edits/add-part';
import type { NewId } from '../edits/edit';
import { joinToNet } from './join-to-net';
import { hangPlace } from './hang-place';
import { drawnNetsNamed, nameOfHeld, type HeldNet } from './named-net';

type AddPart = Extract<RemedyEdit, { edit: 'add part' }>;

const isKind = (kind: string): kind is KindId => (kindIds as readonly string[]).includes(kind);
const markKinds = new Set(['net-name', 'zero-volt', 'note', 'earth']);

/** Pins of true parts on a net, control pins first: what a remedy is about is most often a gate or base. */
function anchorsOf(sheet: Sheet, net: string): readonly PinPlace[] {
  const kinds = new Map(sheet.parts.map((part) => [part.id, part.kind]));
  const pins = drawnNetsNamed(sheet, net).flatMap((drawn) => drawn.net.pins).filter((pin) => !markKinds.has(kinds.get(pin.part) ?? 'note'));
  return [...pins].sort((a, b) => Number(b.pin === 'G' || b.pin === 'B') - Number(a.pin === 'G' || a.pin === 'B'));
}

/** The two nearest pins of two nets, those of one part before others. */
function nearestPair(a: readonly PinPlace[], b: readonly PinPlace[]): readonly [PinPlace, PinPlace] | undefined {
  let best: readonly [PinPlace, PinPlace] | undefined;
  let least = Infinity;
  for (const p of a) for (const q of b) {
    const cost = Math.abs(p.x - q.x) + Math.abs(p.y - q.y) + (p.part === q.part ? 0 : 10_000);
    if (cost < least) [best, least] = [[p, q], cost];
  }
  return best;
}

/** Wires as thin boxes, so that a part does not come to lie on one. */
function wireBoxes(sheet: Sheet): readonly Box[] {
  const index = indexOf(sheet);
  return sheet.wires.flatMap((wire) => {
    const path = wirePath(index, wire);
    return path.slice(1).map((to, place) => {
      const from = path[place] as Point;
      return { left: Math.min(from.x, to.x), right: Math.max(from.x, to.x), top: Math.min(from.y, to.y), bottom: Math.max(from.y, to.y) };
    });
  });
}

/** Contacts come off with the lead: a part hangs from the other pins of a net first. */
const fixedFirst = (sheet: Sheet, pins: readonly PinPlace[]): readonly PinPlace[] => {
  const loose = new Set(sheet.parts.filter((part) => part.kind === 'plug-contact' || part.kind === 'removable-lead').map((part) => part.id));
  return [...pins.filter((pin) => !loose.has(pin.part)), ...pins.filter((pin) => loose.has(pin.part))];
};

/** Where a two-pin part stands best: hanging from the pin it serves when it leads to 0 V, beside both pins otherwise; in either case free of others. */
function placeFor(sheet: Sheet, part: PartRecord, pins: Readonly<Record<string, string>>): PartRecord {
  const wires = wireBoxes(sheet);
  const names = pinPlacesOf(part).map((pin) => pin.pin);
  const [one, two] = [...names].sort((a, b) => Number(pins[a] === '0') - Number(pins[b] === '0'));
  const live = anchorsOf(sheet, pins[one ?? ''] ?? '');
  const pair = nearestPair(live, anchorsOf(sheet, pins[two ?? ''] ?? ''));
  const toZero = two !== undefined && pins[two] === '0';
  const anchor = toZero ? live[0] : pair?.[0] ?? live[0];
  const free = (record: PartRecord) => freePlace(record, [...sheet.parts.map(partBoxOf), ...wires], 15);
  if (!anchor || one === undefined) return free(part);
  const upper = !toZero && pair && pair[1].y < pair[0].y && two !== undefined ? two : one;
  const turned = names.length === 2 ? { ...part, turn: turnedFor(part, upper, 'top') } : part;
  const top = pinPlaceOf({ ...turned, x: 0, y: 0 }, upper) ?? { x: 0, y: 0 };
  const hung = toZero ? hangPlace(sheet, turned, top, fixedFirst(sheet, live), wires) : null;
  if (hung) return hung;
  const at: Point = toZero || !pair ? { x: anchor.x - 30, y: anchor.y + 20 - top.y }
    : { x: snap((pair[0].x + pair[1].x) / 2) - 60, y: snap((pair[0].y + pair[1].y) / 2) };
  return free({ ...turned, x: at.x - top.x, y: at.y });
}

/** Adds the part of a proposed change near the pins it serves and joins it to its nets. Words when it cannot. */
export function addRemedyPart(
  sheet: Sheet, edit: AddPart, nets: ReadonlyMap<string, HeldNet>, newId: NewId,
): { readonly sheet: Sheet; readonly part: string } | { readonly refused: string } {
  if (!isKind(edit.kind)) return { refused: `There is no part of kind ${edit.kind}.` };
  const bare = newPart(sheet, edit.kind, { x: 0, y: 0, turn: 0, mirror: false }, newId(), edit.facts);
  const wrong = Object.keys(edit.pins).find((pin) => !pinPlaceOf(bare, pin));
  if (wrong !== undefined) return { refused: `${bare.ref} has no pin ${wrong}.` };
  const gone = Object.values(edit.pins).find((net) => !nets.has(net));
  if (gone !== undefined) return { refused: `The sheet no longer has a net ${gone}. The change was proposed for an older state.` };
  const now = Object.fromEntries(Object.entries(edit.pins).map(([pin, net]) => [pin, nameOfHeld(sheet, nets.get(net) as HeldNet) ?? net]));
  const placed = placeFor(sheet, bare, now);
  const joins = Object.entries(edit.pins).sort(([, a], [, b]) => Number(a === '0') - Number(b === '0'));
  let current: Sheet = { ...sheet, parts: [...sheet.parts, placed] };
  for (const [pin, net] of joins) current = joinToNet(current, { part: placed.id, pin }, nets.get(net) as HeldNet, newId);
  return { sheet: current, part: placed.id };
}
