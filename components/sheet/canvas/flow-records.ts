import { Position, type Edge, type Node, type NodeHandle } from 'reactflow';
import { partBoxOf, pinPlacesOf } from '@/lib/document/geometry/pin-place';
import type { Box, Point } from '@/lib/document/geometry/point';
import { indexOf } from '@/lib/document/geometry/sheet-index';
import type { JunctionRecord, PartRecord, Sheet, WireEnd, WireRecord } from '@/lib/document/records';

export type PartNode = Node<{ readonly part: PartRecord }, 'part'>;
export type JunctionNode = Node<{ readonly wires: number }, 'junction'>;
export type SheetNode = PartNode | JunctionNode;
export type WireEdge = Edge<{ readonly net: string | undefined; readonly hot: boolean }, 'wire'>;

/** Whole pixels, so that what the browser measures is what was said. */
export function nodeBoxOf(part: PartRecord): Box {
  const box = partBoxOf(part);
  return { left: Math.floor(box.left), top: Math.floor(box.top), right: Math.ceil(box.right), bottom: Math.max(Math.ceil(box.bottom), Math.floor(box.top) + 1) };
}

const handleAt = (id: string, x: number, y: number, out: Point): NodeHandle => ({
  id, type: 'source', x, y, width: 1, height: 1,
  position: out.x < 0 ? Position.Left : out.x > 0 ? Position.Right : out.y < 0 ? Position.Top : Position.Bottom,
});

/** Ends of wires on a part's node, from its left top. */
export function handlesOf(part: PartRecord): readonly NodeHandle[] {
  const box = nodeBoxOf(part);
  return pinPlacesOf(part).map((pin) => handleAt(pin.pin, pin.x - box.left, pin.y - box.top, pin.out));
}

export const junctionHandles: readonly NodeHandle[] = [handleAt('j', 4, 4, { x: 1, y: 0 })];

const partNodes = new WeakMap<PartRecord, PartNode>();

/** Words by which parts and wires are called aloud, by id. */
export type Spoken = ReadonlyMap<string, string>;

/** The node of a part; the same object for as long as the record stays the same. */
function partNode(part: PartRecord, spoken: Spoken): PartNode {
  const known = partNodes.get(part);
  const ariaLabel = spoken.get(part.id) ?? part.ref;
  if (known?.ariaLabel === ariaLabel) return known;
  const box = nodeBoxOf(part);
  const [width, height] = [Math.max(1, box.right - box.left), Math.max(1, box.bottom - box.top)];
  const node: PartNode = {
    id: part.id, type: 'part', position: { x: box.left, y: box.top }, data: { part }, ariaLabel, domAttributes: { 'aria-roledescription': 'part' }, width, height, measured: { width, height },
    handles: [...handlesOf(part)],
  };
  partNodes.set(part, node);
  return node;
}

const junctionNodes = new WeakMap<JunctionRecord, JunctionNode>();

function junctionNode(junction: JunctionRecord, wires: number): JunctionNode {
  const known = junctionNodes.get(junction);
  if (known && known.data.wires === wires) return known;
  const node: JunctionNode = {
    id: junction.id, type: 'junction', position: { x: junction.x - 4, y: junction.y - 4 }, data: { wires },
    width: 8, height: 8, measured: { width: 8, height: 8 }, focusable: false,
    handles: [...junctionHandles],
  };
  junctionNodes.set(junction, node);
  return node;
}

const nodeOfEnd = (end: WireEnd): readonly [string, string] => (end.at === 'pin' ? [end.part, end.pin] : [end.junction, 'j']);

const edges = new WeakMap<WireRecord, WireEdge>();

function wireEdge(wire: WireRecord, spoken: Spoken, net: string | undefined, hot: boolean): WireEdge {
  const known = edges.get(wire);
  const ariaLabel = spoken.get(wire.id) ?? 'Wire';
  if (known?.data && known.data.net === net && known.data.hot === hot && known.ariaLabel === ariaLabel) return known;
  const [source, sourceHandle] = nodeOfEnd(wire.a);
  const [target, targetHandle] = nodeOfEnd(wire.b);
  const edge: WireEdge = { id: wire.id, type: 'wire', ariaLabel, domAttributes: { 'aria-roledescription': 'wire' }, source, sourceHandle, target, targetHandle, data: { net, hot } };
  edges.set(wire, edge);
  return edge;
}

/** Parts and junctions as nodes. Records that did not change give the objects of last time, so that only what moved is drawn anew. */
export function nodesOf(sheet: Sheet, spoken: Spoken): readonly SheetNode[] {
  const index = indexOf(sheet);
  return [
    ...sheet.parts.map((part) => partNode(part, spoken)),
    ...sheet.junctions.map((junction) => junctionNode(junction, index.wiresAt.get(`junction:${junction.id}`)?.length ?? 0)),
  ];
}

/** Wires as edges. Where they run they ask the editor themselves: a drag in progress changes no edge. */
export function edgesOf(sheet: Sheet, spoken: Spoken, netOf: ReadonlyMap<string, string>, isHot: (net: string) => boolean): readonly WireEdge[] {
  return sheet.wires.map((wire) => {
    const net = netOf.get(wire.id);
    return wireEdge(wire, spoken, net, net !== undefined && isHot(net));
  });
}
