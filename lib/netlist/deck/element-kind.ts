import type { KindId } from '../kinds/kind-id';
import { kindIds } from '../kinds/kind-id';
import { kindOf } from '../kinds/kind-registry';
import type { DeckElement, FactValue, ModelCard } from '../netlist';
import { isExamined } from './deck-document';
import { kindOfWord } from './kind-word';

type ReadFacts = Readonly<Record<string, FactValue>>;

/** Elements that a fact line may make a part of another kind than their letter says, by the pins they have. */
const freeKinds: Readonly<Record<string, number>> = { R: 2, C: 2, L: 2, D: 2, V: 2, Q: 3, M: 3, X: Infinity };

/**
 * Which kind of part an element is: the `kind=` of its fact line where it fits the element, else what its other facts, its
 * letter and its model say; a box when nothing does.
 */
export function elementKind(element: DeckElement, facts: ReadFacts, card: ModelCard | undefined): KindId {
  if (!isExamined(element) || element.letter === 'I') return 'box';
  const stated = kindOfWord(facts.kind);
  if (stated && fits(stated, element)) return stated;
  if (element.letter === 'V') return sourceKind(element, facts);
  if (element.letter === 'C' && isPolarised(facts)) return 'polarised-capacitor';
  if (element.letter === 'D' && typeof facts.vz === 'number') return 'zener';
  const type = card && modelPolarity(card);
  return kindIds.find((id) => kindOf(id).deck.read?.(element, type)) ?? 'box';
}

/** A kind fits when the element has a node for each of its pins. */
function fits(kind: KindId, element: DeckElement): boolean {
  const pins = kindOf(kind).pins.length;
  return pins >= 2 && pins <= element.nodes.length && pins <= (freeKinds[element.letter] ?? 0);
}

function sourceKind(element: DeckElement, facts: ReadFacts): KindId {
  if (facts.role === 'mains' && (element.wave?.shape === 'sin' || facts.rms !== undefined)) return 'ac-mains';
  if (facts.role === 'generator' || element.wave) return 'signal-generator';
  return facts.ilim === undefined ? 'dc-source' : 'dc-supply';
}

export function isPolarised(facts: ReadFacts): boolean {
  return facts.polarised === true || facts.plus !== undefined || facts.minus !== undefined;
}

/** nmos or pmos for a VDMOS card too. */
function modelPolarity(card: ModelCard): string {
  if (card.type !== 'vdmos') return card.type;
  return card.flags.includes('pchan') ? 'pmos' : 'nmos';
}
