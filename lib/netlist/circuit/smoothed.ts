import type { NetlistPart } from '../netlist';
import type { Graph } from './graph';
import { isCapacitor } from './part-nature';
import { endNets } from './terminals';
import { walk } from './walk';

/** Nets whose voltage a capacitor holds up between the peaks of an alternating source, 0 V left out. */
export function findSmoothedNets(graph: Graph, parts: readonly NetlistPart[], rails: ReadonlySet<string>): ReadonlySet<string> {
  const nets = new Set<string>();
  for (const part of parts.filter(isCapacitor)) {
    for (const net of (endNets(part) ?? []).filter((end) => !rails.has(end))) {
      const steps = walk(graph, net, {
        through: ({ nature }) => nature === 'joint' || nature === 'resistor' || nature === 'coil',
        stopAt: (at) => rails.has(at),
      });
      for (const reached of steps.keys()) if (reached !== '0') nets.add(reached);
    }
  }
  return nets;
}
