import type { DeckElement, ModelCard, Subcircuit } from '../netlist';

/** An element after every subcircuit was put in its place. */
export interface FlatElement {
  readonly element: DeckElement;
  /** `x1.x2.r3`, lower case. */
  readonly path: string;
  /** Hierarchical node names, lower case: `out`, `x1.n`, `0`. */
  readonly nodes: readonly string[];
  readonly card: ModelCard | undefined;
}

/** What names of models and subcircuits may mean at one place, innermost first. */
export interface Scope {
  readonly models: readonly ModelCard[];
  readonly subcircuits: readonly Subcircuit[];
}

export class FlattenFault extends Error {}

/** As deep as the deck reader lets subcircuits be nested. */
const deepest = 8;

/**
 * Puts subcircuits in place of the `X` elements that name them.
 * @throws FlattenFault when one is not there, takes another number of nodes, or they are nested too deep.
 */
export function flatten(elements: readonly DeckElement[], scope: Scope): readonly FlatElement[] {
  return expand(elements, [scope], '', nodeName);
}

/** The same for one subcircuit, its pins on nodes of the caller's choice. */
export function flattenSubcircuit(subcircuit: Subcircuit, pinNodes: readonly string[], scope: Scope): readonly FlatElement[] {
  return inside(subcircuit, pinNodes, [scope], 'x');
}

function expand(
  elements: readonly DeckElement[], scopes: readonly Scope[], path: string, place: (node: string) => string,
): readonly FlatElement[] {
  return elements.flatMap((element): readonly FlatElement[] => {
    const own = path + element.name.toLowerCase();
    const nodes = element.nodes.map(place);
    if (element.letter !== 'X') {
      return [{ element, path: own, nodes, card: find(scopes, ({ models }) => models, element.model) }];
    }
    const subcircuit = find(scopes, ({ subcircuits }) => subcircuits, element.model);
    if (subcircuit === undefined) throw new FlattenFault(`${own}: the subcircuit ${element.model ?? ''} is not in the deck`);
    return inside(subcircuit, nodes, scopes, own);
  });
}

function inside(
  subcircuit: Subcircuit, pinNodes: readonly string[], scopes: readonly Scope[], path: string,
): readonly FlatElement[] {
  if (scopes.length > deepest) throw new FlattenFault(`${path}: subcircuits are nested deeper than ${deepest}`);
  if (subcircuit.pins.length !== pinNodes.length) {
    throw new FlattenFault(`${path}: ${subcircuit.name} has ${subcircuit.pins.length} pins and is given ${pinNodes.length} nodes`);
  }
  const pins = new Map(subcircuit.pins.map((pin, index) => [nodeName(pin), pinNodes[index] as string]));
  const place = (node: string): string => {
    const name = nodeName(node);
    return name === '0' ? name : pins.get(name) ?? `${path}.${name}`;
  };
  return expand(subcircuit.elements, [subcircuit, ...scopes], `${path}.`, place);
}

/** ngspice takes `gnd` for `0`, and node names without regard to case. */
function nodeName(node: string): string {
  const name = node.toLowerCase();
  return name === 'gnd' ? '0' : name;
}

function find<T extends { readonly name: string }>(
  scopes: readonly Scope[], list: (scope: Scope) => readonly T[], name: string | undefined,
): T | undefined {
  if (name === undefined) return undefined;
  const wanted = name.toLowerCase();
  for (const scope of scopes) {
    const found = list(scope).find((entry) => entry.name.toLowerCase() === wanted);
    if (found !== undefined) return found;
  }
  return undefined;
}
