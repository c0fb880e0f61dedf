import type { NetlistPart } from '../netlist';
import { isTransistor, natureOf, type EdgeNature } from './part-nature';
import { endsOf, netAt, terminalsOf } from './terminals';

/** A conducting or storing link between two nets. Channels of transistors are links too. */
export interface Edge {
  readonly part: NetlistPart;
  readonly nature: EdgeNature;
  /** Net of the first end (plus, line, anode, drain, collector or 1). */
  readonly a: string;
  readonly b: string;
  readonly aPin: string;
  readonly bPin: string;
}

export interface PinRef {
  readonly part: NetlistPart;
  readonly pin: string;
}

export interface Graph {
  readonly edges: readonly Edge[];
  edgesAt(net: string): readonly Edge[];
  pinsOn(net: string): readonly PinRef[];
}

/** The other net of an edge. */
export const acrossFrom = (edge: Edge, net: string): string => (edge.a === net ? edge.b : edge.a);

function edgeOf(part: NetlistPart): Edge | null {
  if (isTransistor(part)) {
    const t = terminalsOf(part);
    return { part, nature: 'channel', a: t.output, b: t.reference, aPin: t.outputPin, bPin: t.referencePin };
  }
  const ends = endsOf(part);
  if (!ends) return null;
  return { part, nature: natureOf(part), a: netAt(part, ends[0]), b: netAt(part, ends[1]), aPin: ends[0], bPin: ends[1] };
}

function add<V>(index: Map<string, V[]>, key: string, value: V): void {
  const list = index.get(key);
  if (list) list.push(value);
  else index.set(key, [value]);
}

export function buildGraph(parts: readonly NetlistPart[]): Graph {
  const edges: Edge[] = [];
  const byNet = new Map<string, Edge[]>();
  const pins = new Map<string, PinRef[]>();
  for (const part of parts) {
    for (const [pin, net] of Object.entries(part.pins)) add(pins, net, { part, pin });
    const edge = edgeOf(part);
    if (!edge || edge.a === edge.b) continue;
    edges.push(edge);
    add(byNet, edge.a, edge);
    add(byNet, edge.b, edge);
  }
  return { edges, edgesAt: (net) => byNet.get(net) ?? [], pinsOn: (net) => pins.get(net) ?? [] };
}
