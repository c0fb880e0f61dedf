import type { Graph } from './graph';
import { walk } from './walk';

/** Nets that sources alone tie to 0 V: their voltage is given, whatever the rest of the circuit does. */
export function findRails(graph: Graph): ReadonlySet<string> {
  return new Set(walk(graph, '0', { through: (edge) => edge.nature === 'source' }).keys());
}

/** Rails and whatever hangs on them through joints (leads, fuses, closed contacts). */
export function findStiffNets(graph: Graph): ReadonlySet<string> {
  return new Set(walk(graph, '0', { through: (edge) => edge.nature === 'source' || edge.nature === 'joint' }).keys());
}
