import Elk, { type ElkExtendedEdge, type ElkNode, type ElkPort } from 'elkjs/lib/elk.bundled.js';
import type { NetlistPart } from '@/lib/netlist/netlist';
import { partBoxOf, pinPlacesOf } from '../geometry/pin-place';
import { joinBoxes, snap, type Box, type Point } from '../geometry/point';
import type { Block } from './block';
import { inLineKinds, isControlPin, type Potential } from './potential';

/** Room round a symbol for its printed words and the lines that pass it. */
const room = { left: 20, top: 30, right: 80, bottom: 30 };

/** Nets with this many pins or more are hung from a point of their own, so that they read as a rail. */
const hubFrom = 3;

/** Nets with more pins than this do not pull their parts together: they are joined by name. */
export const farFrom = 16;

export interface Layout {
  readonly places: ReadonlyMap<string, Point>;
  readonly width: number;
  readonly height: number;
}

const options = {
  'elk.algorithm': 'layered',
  'elk.direction': 'DOWN',
  'elk.randomSeed': '1',
  'elk.edgeRouting': 'ORTHOGONAL',
  'elk.spacing.nodeNode': '20',
  'elk.spacing.componentComponent': '60',
  'elk.layered.spacing.nodeNodeBetweenLayers': '20',
  'elk.spacing.edgeNode': '10',
  'elk.layered.nodePlacement.strategy': 'NETWORK_SIMPLEX',
  'elk.layered.considerModelOrder.strategy': 'NODES_AND_EDGES',
};

const side = (out: Point): string => (out.x < 0 ? 'WEST' : out.x > 0 ? 'EAST' : out.y < 0 ? 'NORTH' : 'SOUTH');

/** Whether a net leaves the part downwards, on its way from the supply to 0 V. A part in line with a rail gives to both sides. */
function givesTo(part: NetlistPart, pin: string, net: string, potential: Potential): boolean {
  if (isControlPin(part, pin)) return false;
  const others = Object.entries(part.pins).filter(([other]) => other !== pin && !isControlPin(part, other)).map(([, other]) => other);
  const fall = potential.fall.get(net);
  if (fall === undefined) return pin === '+';
  if (fall === 0 && inLineKinds.has(part.kind)) return true;
  return others.some((other) => (potential.fall.get(other) ?? Infinity) < fall);
}

function outlineOf(block: Block): Box {
  const box = joinBoxes(block.members.map(({ record }) => partBoxOf(record))) ?? { left: 0, top: 0, right: 0, bottom: 0 };
  return { left: box.left - room.left, top: box.top - room.top, right: box.right + room.right, bottom: box.bottom + room.bottom };
}

interface NetEnd { readonly port: string; readonly block: string; readonly gives: boolean }

function nodeOf(block: Block, potential: Potential, nets: Map<string, NetEnd[]>): ElkNode {
  const box = outlineOf(block);
  const width = box.right - box.left;
  const height = box.bottom - box.top;
  const ports: ElkPort[] = block.members.flatMap(({ part, record }) => pinPlacesOf(record).map((pin) => {
    const id = `${part.id} ${pin.pin}`;
    const net = part.pins[pin.pin];
    if (net !== undefined && net !== '0') {
      const ends = nets.get(net) ?? [];
      ends.push({ port: id, block: block.id, gives: givesTo(part, pin.pin, net, potential) });
      nets.set(net, ends);
    }
    const where = side(pin.out);
    return {
      id, width: 0, height: 0,
      x: where === 'WEST' ? 0 : where === 'EAST' ? width : pin.x - box.left,
      y: where === 'NORTH' ? 0 : where === 'SOUTH' ? height : pin.y - box.top,
      layoutOptions: { 'elk.port.side': where },
    };
  }));
  return { id: block.id, ports, width, height, layoutOptions: { 'elk.portConstraints': 'FIXED_POS' } };
}

/** Places for one sheet area by ELK's layered method: the supply's rail on top, then layer by layer down to 0 V. On the grid, none overlapping. */
export async function layeredLayout(blocks: readonly Block[], potential: Potential): Promise<Layout> {
  const nets = new Map<string, NetEnd[]>();
  const children = blocks.map((block) => nodeOf(block, potential, nets));
  const edges: ElkExtendedEdge[] = [];
  const height = (net: string) => potential.fall.get(net) ?? 99;
  for (const [net, ends] of [...nets].sort(([a], [b]) => height(a) - height(b) || (a < b ? -1 : 1))) {
    if (new Set(ends.map((end) => end.block)).size < 2) continue;
    if (ends.length > farFrom) continue;
    if (ends.length < hubFrom) {
      const [a, b] = [...ends].sort((x, y) => Number(y.gives) - Number(x.gives));
      if (a && b) edges.push({ id: `net ${net}`, sources: [a.port], targets: [b.port] });
      continue;
    }
    const hub = `hub ${net}`;
    children.push({ id: hub, width: 10, height: 10 });
    ends.forEach(({ port, gives }, index) => edges.push({
      id: `net ${net} ${index}`, sources: [gives ? port : hub], targets: [gives ? hub : port],
    }));
  }
  const graph: ElkNode = { id: 'sheet', layoutOptions: options, children, edges };
  const laid: ElkNode = await new Elk().layout(graph);
  const nodes = new Map(laid.children?.map((child) => [child.id, child]));
  const places = new Map(blocks.map((block) => {
    const node = nodes.get(block.id);
    const box = outlineOf(block);
    return [block.id, { x: snap((node?.x ?? 0) - box.left), y: snap((node?.y ?? 0) - box.top) }];
  }));
  return { places, width: laid.width ?? 0, height: laid.height ?? 0 };
}
