import type { FactValue } from '../netlist';
import type { DeckDocument, DeckNotice } from './deck-document';
import { nameKey, nodeKey } from './names';

export interface NamedFacts {
  /** Facts by element, lower-case name. */
  readonly elements: ReadonlyMap<string, Readonly<Record<string, FactValue>>>;
  /** Facts by node key. */
  readonly nodes: ReadonlyMap<string, Readonly<Record<string, FactValue>>>;
  readonly notices: readonly DeckNotice[];
}

/** Sorts fact lines by what they name: an element of that name wins over a node. Later lines add to earlier ones. */
export function namedFacts(document: DeckDocument): NamedFacts {
  const elementKeys = new Set(document.elements.map(({ name }) => nameKey(name)));
  const nodeKeys = new Set(document.elements.flatMap(({ nodes }) => nodes.map(nodeKey)));
  const elements = new Map<string, Record<string, FactValue>>();
  const nodes = new Map<string, Record<string, FactValue>>();
  const notices: DeckNotice[] = [];
  for (const { line, name, facts } of document.factLines) {
    if (elementKeys.has(nameKey(name))) addFacts(elements, nameKey(name), facts);
    else if (nodeKeys.has(nodeKey(name))) addFacts(nodes, nodeKey(name), facts);
    else notices.push({ line, text: `The fact line names ${name}, which is neither an element nor a node of the deck.` });
  }
  return { elements, nodes, notices };
}

function addFacts(all: Map<string, Record<string, FactValue>>, key: string, facts: Readonly<Record<string, FactValue>>): void {
  const known = all.get(key) ?? {};
  all.set(key, Object.assign(known, facts));
}
