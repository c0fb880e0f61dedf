import { byCodeUnit, compareDesignators } from '../designators/designator';
import type { Facts, FactValue, Net } from '../netlist';
import { addToList } from './add-to-list';
import { pinEnd } from './end-key';
import type { DrawnPart, NetlistSource } from './netlist-source';
import { pinNames } from './pin-names';
import { pinReference } from './pin-reference';
import { sortedByKey } from './sorted-by-key';
import { UnionFind } from './union-find';

export interface DrawnNets {
  /** '0' first, then by name in natural order. */
  readonly list: readonly Net[];
  nameOf(partId: string, pin: string): string;
}

const zeroVolts = '0';
const zeroKey = 'name\u0000zero';
const nameKey = (name: string) => (name === zeroVolts ? zeroKey : `name\u0000given\u0000${name}`);

/** What marks say of a node. */
interface Marked {
  readonly names: Set<string>;
  readonly facts: Record<string, FactValue>;
}

/** Nets of the parts drawn, which are in canonical order. Nodes without a pin of a part are no nets. */
export function drawnNets(source: NetlistSource, parts: readonly DrawnPart[]): DrawnNets {
  const nodes = joinedNodes(source);
  const marked = marksByNode(source.parts, nodes);
  const members = new Map<string, string[]>();
  for (const part of parts) {
    for (const pin of pinNames(part)) {
      const node = nodes.find(pinEnd(part.id, pin));
      addToList(members, node, pinReference({ ref: part.ref, facts: part.facts as Facts }, pin));
    }
  }
  const names = nodeNames([...members.keys()], marked, nodes.find(zeroKey));
  const list = [...members].map(([node, pins]): Net => ({
    name: names.get(node) as string,
    givenNames: [...(marked.get(node)?.names ?? [])].sort(byCodeUnit),
    pins,
    facts: sortedByKey((marked.get(node)?.facts ?? {}) as Facts),
  }));
  return {
    list: list.sort((a, b) => compareNetNames(a.name, b.name)),
    nameOf: (partId, pin) => names.get(nodes.find(pinEnd(partId, pin))) as string,
  };
}

function joinedNodes(source: NetlistSource): UnionFind {
  const nodes = new UnionFind();
  for (const [a, b] of source.joins) nodes.join(a, b);
  for (const part of source.parts) {
    if (part.kind === 'zero-volt') nodes.join(zeroKey, pinEnd(part.id, '1'));
    const name = givenName(part);
    if (name !== undefined) nodes.join(nameKey(name), pinEnd(part.id, '1'));
  }
  return nodes;
}

/** Name on a net-name mark without outer space; undefined for an empty one and for other parts. */
function givenName(part: DrawnPart): string | undefined {
  if (part.kind !== 'net-name' || typeof part.facts.name !== 'string') return undefined;
  return part.facts.name.trim() || undefined;
}

function marksByNode(parts: readonly DrawnPart[], nodes: UnionFind): Map<string, Marked> {
  const marked = new Map<string, Marked>();
  const at = (part: DrawnPart) => {
    const node = nodes.find(pinEnd(part.id, '1'));
    const known = marked.get(node) ?? { names: new Set(), facts: {} };
    marked.set(node, known);
    return known;
  };
  for (const part of [...parts].sort((a, b) => byCodeUnit(a.id, b.id))) {
    const name = givenName(part);
    if (name !== undefined) {
      const { name: _name, ...facts } = part.facts;
      if (name !== zeroVolts) at(part).names.add(name);
      Object.assign(at(part).facts, facts);
    }
    if (part.kind === 'earth') at(part).facts.kind = 'earth';
  }
  return marked;
}

/** '0', the first given name, or the next free N1, N2 … in the order in which the nodes' pins come. */
function nodeNames(nodes: readonly string[], marked: ReadonlyMap<string, Marked>, zero: string): Map<string, string> {
  const given = new Set([...marked.values()].flatMap(({ names }) => [...names]));
  const names = new Map<string, string>();
  let number = 0;
  const nextFree = () => {
    do number += 1; while (given.has(`N${number}`));
    return `N${number}`;
  };
  for (const node of nodes) {
    const first = [...(marked.get(node)?.names ?? [])].sort(byCodeUnit)[0];
    names.set(node, node === zero ? zeroVolts : (first ?? nextFree()));
  }
  return names;
}

/** '0' first, then natural order. */
export function compareNetNames(a: string, b: string): number {
  return Number(b === zeroVolts) - Number(a === zeroVolts) || compareDesignators(a, b);
}
