import type { NetlistPart } from '../netlist';
import type { Graph } from './graph';
import { isVoltageSource } from './part-nature';
import { isMains } from './source-role';
import { endNets } from './terminals';
import { walk } from './walk';

/** Nets that a mains source feeds, 0 V left out. */
export function findMainsNets(graph: Graph, parts: readonly NetlistPart[], rails: ReadonlySet<string>): ReadonlySet<string> {
  const fed = new Set<string>();
  for (const source of parts.filter(isMains)) {
    const own = new Set((endNets(source) ?? []).filter((net) => net !== '0'));
    for (const start of own) {
      const steps = walk(graph, start, {
        through: (edge) => !isVoltageSource(edge.part),
        stopAt: (net) => net === '0' || (rails.has(net) && !own.has(net)),
      });
      for (const net of steps.keys()) if (net !== '0') fed.add(net);
    }
  }
  return fed;
}
