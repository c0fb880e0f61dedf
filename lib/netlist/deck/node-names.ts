import type { DeckElement } from '../netlist';
import type { NamedFacts } from './element-facts';
import { nodeKey } from './names';

/**
 * Net name of each node, by node key: 0 for the 0 V node, else the `name=` of its fact line, else as the deck first spells
 * it. Nodes whose fact lines give the same name keep their own spelling, for in a deck they are two.
 */
export function nodeNames(elements: readonly DeckElement[], { nodes: facts }: NamedFacts): Map<string, string> {
  const names = new Map<string, string>();
  const taken = new Set<string>(['0']);
  const spellings = new Map<string, string>();
  for (const node of elements.flatMap(({ nodes }) => nodes)) {
    const key = nodeKey(node);
    if (!spellings.has(key)) spellings.set(key, key === '0' ? '0' : node);
  }
  for (const key of spellings.keys()) {
    const given = facts.get(key)?.name;
    if (key !== '0' && typeof given === 'string' && given.trim() !== '' && !taken.has(given.trim())) {
      names.set(key, given.trim());
      taken.add(given.trim());
    }
  }
  for (const [key, spelling] of spellings) {
    if (names.has(key)) continue;
    let name = spelling;
    while (key !== '0' && taken.has(name)) name += '_';
    names.set(key, name);
    taken.add(name);
  }
  return names;
}
