import type { Net, Netlist } from '@/lib/netlist/netlist';
import { partBoxOf, pinPlaceOf, type PinPlace } from '../geometry/pin-place';
import type { Point } from '../geometry/point';
import type { Turn } from '../geometry/turn';
import type { JunctionRecord, PartRecord, WireEnd, WireRecord } from '../records';
import { layNet, type Tree } from './lay-net';
import { traceWires } from './trace-wires';
import { cellOf, pointOf, TrackGrid, type Cell } from './track-grid';

/** Longest line drawn before a net is named at both ends instead, in grid steps with penalties for bends and crossings. */
const lineLimit = 140;

const hasFacts = (net: Net): boolean => Object.keys(net.facts).length > 0;

export interface WiredSheet {
  readonly marks: readonly PartRecord[];
  readonly wires: readonly WireRecord[];
  readonly junctions: readonly JunctionRecord[];
}

/** Turn of a mark whose symbol leaves the pin the way `out` points, from the way it is drawn. */
const turnFrom = (drawn: Point, out: Point): Turn => {
  const angle = (Math.atan2(out.y, out.x) - Math.atan2(drawn.y, drawn.x)) * (180 / Math.PI);
  return ((Math.round(angle / 90) * 90 + 720) % 360) as Turn;
};

/**
 * Joins placed parts as the netlist says: 0 V by a symbol at each pin, near pins by lines at right angles that touch no
 * body and no other net, far ones by the net's name. Names that people gave and facts of a net stand on marks of the sheet.
 */
export function wireUp(netlist: Netlist, records: readonly PartRecord[], newId: (kind: 'wire' | 'junction' | 'mark') => string): WiredSheet {
  const grid = new TrackGrid();
  const marks: PartRecord[] = [];
  const wires: WireRecord[] = [];
  const junctions: JunctionRecord[] = [];
  const byId = new Map(records.map((record) => [record.id, record]));
  const pinsOf = new Map<string, PinPlace[]>();
  records.forEach((record) => grid.addBody(partBoxOf(record)));
  for (const part of netlist.parts) {
    const record = byId.get(part.id);
    for (const [pin, net] of record ? Object.entries(part.pins) : []) {
      const place = record && pinPlaceOf(record, pin);
      if (!place) continue;
      grid.addPin(place, net);
      pinsOf.set(net, [...(pinsOf.get(net) ?? []), place]);
    }
  }
  const mark = (kind: 'zero-volt' | 'net-name', at: Point, turn: Turn, facts: PartRecord['facts']): PartRecord => {
    const record: PartRecord = { id: newId('mark'), ref: '', kind, x: at.x, y: at.y, turn, mirror: false, facts, origins: {}, leftOpen: [] };
    marks.push(record);
    return record;
  };
  const zero = netlist.nets.find((net) => net.name === '0');
  const zeroNames = zero ? [...zero.givenNames, ...(hasFacts(zero) ? ['0'] : [])] : [];
  for (const [index, name] of zeroNames.entries()) {
    const pin = pinsOf.get('0')?.[0];
    if (zero && pin) mark('net-name', pin, index % 2 === 0 ? 0 : 180, { ...(index === 0 ? zero.facts : {}), name } as PartRecord['facts']);
  }
  for (const pin of pinsOf.get('0') ?? []) grid.addBody(partBoxOf(mark('zero-volt', pin, turnFrom({ x: 0, y: 1 }, pin.out), {})));
  const ordered = netlist.nets.filter((net) => net.name !== '0').map((net) => ({ net, pins: pinsOf.get(net.name) ?? [] }))
    .sort((a, b) => a.pins.length - b.pins.length || (a.net.name < b.net.name ? -1 : 1));
  const laid = ordered.map(({ net, pins }) => ({ net, trees: layNet(grid, net.name, pins, lineLimit) }));
  for (const { net, trees } of laid) {
    trees.forEach((tree, index) => {
      const pinAt = new Map<Cell, WireEnd>(tree.pins.map((pin) => [cellOf(pin), { at: 'pin', part: pin.part, pin: pin.pin }]));
      const names = net.givenNames.length > 0 ? net.givenNames : trees.length > 1 || hasFacts(net) ? [net.name] : [];
      for (const name of index === 0 ? names : names.slice(0, 1)) {
        const at = placeOfName(tree, pinAt);
        const record = mark('net-name', at.point, at.turn, { ...(index === 0 && name === names[0] ? net.facts : {}), name } as PartRecord['facts']);
        if (!pinAt.has(at.cell)) pinAt.set(at.cell, { at: 'pin', part: record.id, pin: '1' });
      }
      const traced = traceWires(tree.paths, pinAt, newId);
      wires.push(...traced.wires);
      junctions.push(...traced.junctions);
    });
  }
  return { marks, wires, junctions };
}

/** Shortest level run that takes a name's words; a longer upright one is chosen before a shorter level one. In grid steps. */
const roomForWords = 6;

/** A name stands in the middle of a straight run of its net's lines, above a level one or beside an upright one; without a line, at the pin, turned away from the body. */
function placeOfName(tree: Tree, taken: ReadonlyMap<Cell, WireEnd>): { readonly cell: Cell; readonly point: Point; readonly turn: Turn } {
  const longest = (level: boolean) => tree.paths.flatMap((path) => straightRuns(path, taken, level))
    .reduce<readonly Cell[]>((best, run) => (run.length > best.length ? run : best), []);
  const [level, upright] = [longest(true), longest(false)];
  const run = level.length >= roomForWords || level.length >= upright.length ? level : upright;
  const cell = run[Math.floor(run.length / 2)];
  if (cell !== undefined) return { cell, point: pointOf(cell), turn: run === level ? 0 : 90 };
  const pin = tree.pins[0] as PinPlace;
  return { cell: cellOf(pin), point: { x: pin.x, y: pin.y }, turn: turnFrom({ x: 1, y: 0 }, pin.out) };
}

/** Stretches of a path that run one way and stand free of pins, corners and ends. */
function straightRuns(path: readonly Cell[], taken: ReadonlyMap<Cell, WireEnd>, level: boolean): readonly (readonly Cell[])[] {
  const runs: Cell[][] = [[]];
  path.forEach((cell, index) => {
    const before = path[index - 1];
    const after = path[index + 1];
    const [from, to] = before === undefined || after === undefined ? [] : [pointOf(before), pointOf(after)];
    const straight = from && to && (level ? from.y === to.y : from.x === to.x);
    if (straight && !taken.has(cell)) runs.at(-1)?.push(cell);
    else if (runs.at(-1)?.length) runs.push([]);
  });
  return runs;
}
