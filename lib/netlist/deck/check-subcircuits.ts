import type { DeckElement, Subcircuit } from '../netlist';
import type { DeckDocument } from './deck-document';
import { deckLimits } from './deck-limits';
import { DeckRefusal } from './deck-refusal';
import { namedFacts } from './element-facts';
import { elementKind } from './element-kind';
import { nameKey } from './names';

/** Subcircuits in reach, by lower-case name. */
type Reach = ReadonlyMap<string, { readonly subcircuit: Subcircuit; readonly reach: Reach }>;

/**
 * Throws `DeckRefusal` when a call names no subcircuit or has a wrong number of nodes, when subcircuits call each other in a ring or
 * too deep, or when the parts are too many once all are expanded. An X that a fact line makes one part needs none.
 */
export function checkSubcircuits(document: DeckDocument): void {
  const facts = namedFacts(document).elements;
  const isWhole = (element: DeckElement) => element.letter === 'X' && elementKind(element, facts.get(nameKey(element.name)) ?? {}, undefined) !== 'box';
  const calls = document.elements.filter((element) => !isWhole(element));
  const inside = expansion(calls, reachOf(document.subcircuits, new Map()), new Map(), []);
  const total = document.elements.length - calls.length + inside.parts;
  if (total > deckLimits.parts) throw new DeckRefusal(1, `The deck has ${total} parts with its subcircuits expanded; at most ${deckLimits.parts} are checked.`);
}

function reachOf(subcircuits: readonly Subcircuit[], around: Reach): Reach {
  const reach = new Map(around);
  for (const subcircuit of subcircuits) {
    reach.set(nameKey(subcircuit.name), { subcircuit, get reach() { return reachOf(subcircuit.subcircuits, reach); } });
  }
  return reach;
}

interface Expansion {
  readonly parts: number;
  /** Calls inside one another, 0 where there is none. */
  readonly depth: number;
}

function expansion(elements: readonly DeckElement[], reach: Reach, known: Map<Subcircuit, Expansion>, path: readonly Subcircuit[]): Expansion {
  let parts = 0;
  let depth = 0;
  for (const element of elements) {
    if (element.letter !== 'X') {
      parts += 1;
      continue;
    }
    const called = reach.get(nameKey(element.model as string));
    if (!called) throw new DeckRefusal(element.line, `${element.name} names the subcircuit ${element.model}, which the deck does not have.`);
    const { subcircuit } = called;
    if (subcircuit.pins.length !== element.nodes.length) {
      throw new DeckRefusal(element.line, `${element.name} has ${element.nodes.length} nodes; ${subcircuit.name} takes ${subcircuit.pins.length}.`);
    }
    if (path.includes(subcircuit)) throw new DeckRefusal(element.line, `The subcircuit ${subcircuit.name} calls itself.`);
    const inside = known.get(subcircuit) ?? expansion(subcircuit.elements, called.reach, known, [...path, subcircuit]);
    known.set(subcircuit, inside);
    parts += inside.parts;
    depth = Math.max(depth, inside.depth + 1);
    if (depth > deckLimits.depth) throw new DeckRefusal(element.line, `Subcircuits call each other more than ${deckLimits.depth} deep.`);
  }
  return { parts, depth };
}
