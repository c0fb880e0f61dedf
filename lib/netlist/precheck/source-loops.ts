import { UnionFind } from '../connectivity/union-find';
import type { NetlistPart } from '../netlist';
import type { PrecheckFinding } from './precheck';

interface StiffEdge {
  readonly part: NetlistPart;
  readonly nets: readonly [string, string];
  readonly stiff?: 'source' | 'coil';
}

/**
 * Rings that hold an ideal source: its current would be undefined. Coils among themselves are no ring here, because each
 * has its small resistance in a run.
 */
export function sourceLoops(edges: readonly StiffEdge[]): readonly PrecheckFinding[] {
  const findings: PrecheckFinding[] = [];
  const joined = new UnionFind();
  const laid: StiffEdge[] = [];
  const lay = (edge: StiffEdge): void => {
    joined.join(...edge.nets);
    laid.push(edge);
  };

  for (const edge of edges) if (edge.stiff === 'coil') lay(edge);
  for (const edge of edges) {
    if (edge.stiff !== 'source') continue;
    const [from, to] = edge.nets;
    if (from === to) {
      findings.push({ code: 'V_SHORTED', nets: [from], parts: [edge.part.ref], words: `${edge.part.ref} is shorted: both its ends are on ${from}` });
    } else if (joined.find(from) === joined.find(to)) {
      const ring = [edge, ...pathBetween(from, to, laid)].map(({ part }) => part.ref);
      findings.push({
        code: 'V_OR_L_LOOP', nets: [from, to], parts: ring,
        words: `${ring.join(', ')} close a ring without resistance: give a source its \`rs\` or limit, or a coil its winding resistance`,
      });
    } else {
      lay(edge);
    }
  }
  return findings;
}

/** Edges of a shortest path over what is laid. */
function pathBetween(from: string, to: string, laid: readonly StiffEdge[]): readonly StiffEdge[] {
  const reached = new Map<string, readonly StiffEdge[]>([[from, []]]);
  const queue = [from];
  for (let net = queue.shift(); net !== undefined; net = queue.shift()) {
    const path = reached.get(net) ?? [];
    if (net === to) return path;
    for (const edge of laid) {
      const [a, b] = edge.nets;
      const next = a === net ? b : b === net ? a : undefined;
      if (next === undefined || reached.has(next)) continue;
      reached.set(next, [...path, edge]);
      queue.push(next);
    }
  }
  return [];
}
