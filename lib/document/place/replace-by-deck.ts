import type { Netlist, NetlistPart } from '@/lib/netlist/netlist';
import { partBoxOf } from '../geometry/pin-place';
import type { Point } from '../geometry/point';
import { sheetToNetlist } from '../nets/sheet-to-netlist';
import type { PartRecord, Sheet } from '../records';
import { freePlace } from './free-place';
import { placeNetlist, recordOf, serialIds } from './place-netlist';
import { wireUp } from './wire-up';

/** Kept parts below this share of the new ones leave no drawing worth keeping: all is placed anew. */
const worthKeeping = 1 / 3;

/**
 * The sheet with parts, wires and net names replaced by those of a deck. A part whose designator is in both keeps its
 * id and, where its kind is the same, its place; title, plan, scenarios and notes stay, and so do test points whose net is still there.
 */
export async function replaceByDeck(sheet: Sheet, deck: Netlist, newId: (kind: string) => string = serialIds('deck')): Promise<Sheet> {
  const netlist = withTestPoints(sheet, withKnownIds(sheet, deck));
  const old = new Map(sheet.parts.map((part) => [part.id, part]));
  const fresh = await placeNetlist(netlist, newId);
  const keeps = (part: NetlistPart) => old.get(part.id)?.kind === part.kind;
  const kept = netlist.parts.filter(keeps);
  const rest = {
    title: sheet.title, scenarios: sheet.scenarios, holdPoints: sheet.holdPoints, models: netlist.models, subcircuits: netlist.subcircuits,
  };
  const notes = sheet.parts.filter((part) => part.kind === 'note');
  if (kept.length < netlist.parts.length * worthKeeping) return { ...fresh, ...rest, parts: [...fresh.parts, ...notes] };
  const freshById = new Map(fresh.parts.map((part) => [part.id, part]));
  const records: PartRecord[] = kept.map((part) => {
    const { x, y, turn, mirror, leftOpen } = old.get(part.id) as PartRecord;
    return { ...recordOf(part), x, y, turn, mirror, leftOpen };
  });
  const shift = shiftOf(records, freshById);
  for (const part of netlist.parts.filter((other) => !keeps(other))) {
    const record = freshById.get(part.id) ?? recordOf(part);
    records.push(freePlace({ ...record, x: record.x + shift.x, y: record.y + shift.y }, records.map(partBoxOf)));
  }
  const wired = wireUp(netlist, records, newId);
  return { ...rest, parts: [...records, ...wired.marks, ...notes], wires: wired.wires, junctions: wired.junctions };
}

/** Ids of the sheet for designators it already has; ids of its other parts are not given away again. */
function withKnownIds(sheet: Sheet, deck: Netlist): Netlist {
  const waiting = new Map<string, string[]>();
  for (const part of sheet.parts) if (part.ref !== '') waiting.set(part.ref, [...(waiting.get(part.ref) ?? []), part.id]);
  const used = new Set(sheet.parts.map((part) => part.id));
  const free = (id: string): string => (used.has(id) ? free(`${id}'`) : id);
  const parts = deck.parts.map((part) => {
    const id = waiting.get(part.ref)?.shift() ?? free(part.id);
    used.add(id);
    return { ...part, id };
  });
  return { ...deck, parts };
}

/** Test points are not in a deck: each stays on the net of the pins that it was joined to, as far as the deck still has one of them. */
function withTestPoints(sheet: Sheet, netlist: Netlist): Netlist {
  const before = sheetToNetlist(sheet);
  const netOfPin = new Map(netlist.parts.flatMap((part) => Object.entries(part.pins).map(([pin, net]) => [`${part.id} ${pin}`, net])));
  const points = before.parts.filter((part) => part.kind === 'test-point').flatMap((point) => {
    const neighbour = before.parts.flatMap((part) => Object.entries(part.pins)
      .filter(([, net]) => part.id !== point.id && net === point.pins['1']).map(([pin]) => netOfPin.get(`${part.id} ${pin}`)))
      .find((net) => net !== undefined);
    return neighbour === undefined || netlist.parts.some((part) => part.id === point.id) ? [] : [{ ...point, pins: { '1': neighbour } }];
  });
  return { ...netlist, parts: [...netlist.parts, ...points] };
}

/** Middle of the way from where kept parts would be placed anew to where they stand. */
function shiftOf(records: readonly PartRecord[], fresh: ReadonlyMap<string, PartRecord>): Point {
  const middle = (values: readonly number[]) => [...values].sort((a, b) => a - b)[Math.floor(values.length / 2)] ?? 0;
  return {
    x: middle(records.map((record) => record.x - (fresh.get(record.id)?.x ?? record.x))),
    y: middle(records.map((record) => record.y - (fresh.get(record.id)?.y ?? record.y))),
  };
}
