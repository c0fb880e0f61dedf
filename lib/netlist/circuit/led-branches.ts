import type { NetlistPart } from '../netlist';
import { acrossFrom, type Edge, type Graph } from './graph';
import { isOwnResistor, isTransistor } from './part-nature';
import { terminalsOf } from './terminals';

/** LEDs in one series path, with the resistors that set their current. */
export interface LedBranch {
  readonly leds: readonly NetlistPart[];
  /** Resistors in their own right in the path. */
  readonly resistors: readonly NetlistPart[];
  /** Every part of the path, from one end to the other. */
  readonly parts: readonly NetlistPart[];
  /** Nets at which the path ends: rails, junctions or the terminal of a transistor. */
  readonly ends: readonly [string, string];
  /** Transistors that carry the path's current at one of its ends. */
  readonly transistors: readonly NetlistPart[];
}

const marks = new Set(['test-point', 'net-name', 'zero-volt', 'earth', 'note']);

/** The only other edge on a net that joins exactly two part pins; null at junctions, rails and transistors. */
function onward(graph: Graph, rails: ReadonlySet<string>, net: string, from: Edge): Edge | null {
  if (rails.has(net)) return null;
  const pins = graph.pinsOn(net).filter(({ part }) => !marks.has(part.kind));
  if (pins.length !== 2) return null;
  const next = graph.edgesAt(net).find((edge) => edge.part.id !== from.part.id);
  return next && next.nature !== 'channel' && next.nature !== 'source' && next.nature !== 'capacitor' ? next : null;
}

function follow(graph: Graph, rails: ReadonlySet<string>, start: Edge, net: string): { readonly edges: readonly Edge[]; readonly end: string } {
  const edges: Edge[] = [];
  let at = net;
  let edge: Edge = start;
  for (let next = onward(graph, rails, at, edge); next && next.part.id !== start.part.id; next = onward(graph, rails, at, edge)) {
    edges.push(next);
    at = acrossFrom(next, at);
    edge = next;
  }
  return { edges, end: at };
}

/** Series paths that hold LEDs, each once, in canonical part order. */
export function findLedBranches(graph: Graph, rails: ReadonlySet<string>): readonly LedBranch[] {
  const seen = new Set<string>();
  const branches: LedBranch[] = [];
  for (const edge of graph.edges) {
    if (edge.part.kind !== 'led' || seen.has(edge.part.id)) continue;
    const up = follow(graph, rails, edge, edge.a);
    const down = follow(graph, rails, edge, edge.b);
    const parts = [...[...up.edges].reverse(), edge, ...down.edges].map((link) => link.part);
    const leds = parts.filter((part) => part.kind === 'led');
    for (const led of leds) seen.add(led.id);
    const ends: readonly [string, string] = [up.end, down.end];
    branches.push({
      leds, parts, ends,
      resistors: parts.filter(isOwnResistor),
      transistors: ends.flatMap((net) => (rails.has(net) ? [] : graph.pinsOn(net)
        .filter(({ part, pin }) => isTransistor(part) && pin !== terminalsOf(part).controlPin).map(({ part }) => part))),
    });
  }
  return branches;
}
