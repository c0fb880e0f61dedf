import { junctionEnd, pinEnd } from '@/lib/netlist/connectivity/end-key';
import { UnionFind } from '@/lib/netlist/connectivity/union-find';
import { pinPlacesOf, type PinPlace } from '../geometry/pin-place';
import type { Sheet } from '../records';
import { endKeyOf, joinsOf } from './joins';

/** What lines join on the sheet: net names and 0 V symbols still stand for themselves here. */
export interface DrawnNet {
  readonly pins: readonly PinPlace[];
  readonly wires: readonly string[];
  readonly junctions: readonly string[];
}

const cache = new WeakMap<Sheet, readonly DrawnNet[]>();

/** Pins, wires and junctions that belong together, in the order in which the sheet holds them. */
export function drawnNets(sheet: Sheet): readonly DrawnNet[] {
  const known = cache.get(sheet);
  if (known) return known;
  const sets = new UnionFind();
  for (const [a, b] of joinsOf(sheet)) sets.join(a, b);
  const nets = new Map<string, { pins: PinPlace[]; wires: string[]; junctions: string[] }>();
  const netOf = (key: string) => {
    const root = sets.find(key);
    const net = nets.get(root) ?? { pins: [], wires: [], junctions: [] };
    nets.set(root, net);
    return net;
  };
  for (const part of sheet.parts) for (const pin of pinPlacesOf(part)) netOf(pinEnd(part.id, pin.pin)).pins.push(pin);
  for (const junction of sheet.junctions) netOf(junctionEnd(junction.id)).junctions.push(junction.id);
  for (const wire of sheet.wires) netOf(endKeyOf(wire.a)).wires.push(wire.id);
  const list = [...nets.values()];
  cache.set(sheet, list);
  return list;
}
