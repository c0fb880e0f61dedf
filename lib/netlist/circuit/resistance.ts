import type { Edge } from './graph';
import { ohmsOf } from './part-nature';

class Union {
  private readonly parent = new Map<string, string>();

  root(net: string): string {
    let root = net;
    for (let up = this.parent.get(root); up !== undefined; up = this.parent.get(root)) root = up;
    return root;
  }

  join(a: string, b: string): void {
    const [ra, rb] = [this.root(a), this.root(b)];
    if (ra !== rb) this.parent.set(ra, rb);
  }
}

/**
 * DC resistance between two nets through resistors, coils, joints and sources (sources shorted), in ohms; 0 when they
 * are one net, Infinity without a path. `gone` are parts taken out.
 */
export function resistanceBetween(edges: readonly Edge[], from: string, to: string, gone: ReadonlySet<string> = new Set()): number {
  const short = new Union();
  const links: { readonly a: string; readonly b: string; readonly siemens: number }[] = [];
  for (const edge of edges) {
    if (gone.has(edge.part.id)) continue;
    const ohms = ohmsOf(edge.part);
    if (edge.nature === 'source' || edge.nature === 'joint' || ((edge.nature === 'coil' || edge.nature === 'resistor') && ohms === 0)) short.join(edge.a, edge.b);
    else if (edge.nature === 'resistor' || edge.nature === 'coil') links.push({ a: edge.a, b: edge.b, siemens: 1 / ohms });
  }
  const start = short.root(from);
  const end = short.root(to);
  if (start === end) return 0;
  const live = links.map((link) => ({ a: short.root(link.a), b: short.root(link.b), siemens: link.siemens })).filter((link) => link.a !== link.b);
  // What hangs behind either end carries no current: the smaller side decides, and a hub such as 0 V is not walked through.
  const [one, other] = [reachable(live, start, end), reachable(live, end, start)];
  if (!one.has(end)) return Infinity;
  return one.size <= other.size ? solve(live, [...one], start, end) : solve(live, [...other], end, start);
}

/** Nets reached from `start` without passing through `end`, both included when there is a path. */
function reachable(links: readonly { readonly a: string; readonly b: string }[], start: string, end: string): ReadonlySet<string> {
  const next = new Map<string, string[]>();
  const note = (from: string, to: string) => {
    const known = next.get(from);
    if (known) known.push(to);
    else next.set(from, [to]);
  };
  for (const { a, b } of links) {
    note(a, b);
    note(b, a);
  }
  const seen = new Set([start]);
  for (const net of seen) if (net !== end) for (const other of next.get(net) ?? []) seen.add(other);
  return seen;
}

/** Volts at `start` for one amp into it and out of `end`: Gaussian elimination on the conductance matrix. */
function solve(links: readonly { readonly a: string; readonly b: string; readonly siemens: number }[], nodes: readonly string[], start: string, end: string): number {
  const free = nodes.filter((node) => node !== end);
  const index = new Map(free.map((node, i) => [node, i]));
  const n = free.length;
  const m = free.map(() => new Float64Array(n + 1));
  for (const { a, b, siemens } of links) {
    const [i, j] = [index.get(a), index.get(b)];
    if (i !== undefined) m[i]![i]! += siemens;
    if (j !== undefined) m[j]![j]! += siemens;
    if (i !== undefined && j !== undefined) {
      m[i]![j]! -= siemens;
      m[j]![i]! -= siemens;
    }
  }
  m[index.get(start)!]![n] = 1;
  for (let col = 0; col < n; col += 1) {
    let pivot = col;
    for (let row = col + 1; row < n; row += 1) if (Math.abs(m[row]![col]!) > Math.abs(m[pivot]![col]!)) pivot = row;
    [m[col], m[pivot]] = [m[pivot]!, m[col]!];
    const diagonal = m[col]![col]!;
    if (diagonal === 0) continue;
    for (let row = 0; row < n; row += 1) {
      if (row === col || m[row]![col] === 0) continue;
      const factor = m[row]![col]! / diagonal;
      for (let k = col; k <= n; k += 1) m[row]![k]! -= factor * m[col]![k]!;
    }
  }
  const i = index.get(start)!;
  return m[i]![n]! / m[i]![i]!;
}
