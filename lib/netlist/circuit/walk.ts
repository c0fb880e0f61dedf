import { acrossFrom, type Edge, type Graph } from './graph';

/** How a net was reached: through which edge and from which net. The start has neither. */
export interface Step {
  readonly net: string;
  readonly via: Edge | null;
  readonly from: string | null;
}

export interface WalkOptions {
  /** Whether an edge is followed; `from` is the net it is met at. */
  readonly through: (edge: Edge, from: string) => boolean;
  /** Nets that are reached and not walked beyond. The start is always left. */
  readonly stopAt?: (net: string) => boolean;
}

/** Breadth-first walk from a net; shortest way first, in canonical part order. */
export function walk(graph: Graph, start: string, { through, stopAt }: WalkOptions): ReadonlyMap<string, Step> {
  const seen = new Map<string, Step>([[start, { net: start, via: null, from: null }]]);
  const queue = [start];
  for (let index = 0; index < queue.length; index += 1) {
    const net = queue[index]!;
    if (net !== start && stopAt?.(net)) continue;
    for (const edge of graph.edgesAt(net)) {
      const next = acrossFrom(edge, net);
      if (seen.has(next) || !through(edge, net)) continue;
      seen.set(next, { net: next, via: edge, from: net });
      queue.push(next);
    }
  }
  return seen;
}

/** Edges from the start of a walk to a net it reached, start first. */
export function pathTo(steps: ReadonlyMap<string, Step>, net: string): readonly Edge[] {
  const path: Edge[] = [];
  let step = steps.get(net);
  while (step?.via && step.from !== null) {
    path.unshift(step.via);
    step = steps.get(step.from);
  }
  return path;
}
