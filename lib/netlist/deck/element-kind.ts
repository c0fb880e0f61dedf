import type { KindId } from '../kinds/kind-id';
import { kindIds } from '../kinds/kind-id';
import { kindOf } from '../kinds/kind-registry';
import type { DeckElement, FactValue, ModelCard } from '../netlist';
import { isExamined } from './deck-document';
import { kindOfWord } from './kind-word';

type ReadFacts = Readonly<Record<string, FactValue>>;

/** Kinds that a fact line may make of an element, by its letter; of an X any that has no more pins than it has nodes. */
const kindsOfLetter: Readonly<Record<string, readonly KindId[]>> = {
  R: ['resistor', 'removable-lead', 'plug-contact', 'switch', 'fuse'],
  C: ['capacitor', 'polarised-capacitor'],
  L: ['inductor', 'air-core-coil'],
  D: ['diode', 'schottky', 'zener', 'led'],
  V: ['dc-source', 'dc-supply', 'signal-generator', 'ac-mains'],
  Q: ['npn', 'pnp'],
  M: ['nmos', 'pmos'],
};

/**
 * Which kind of part an element is: the `kind=` of its fact line where it fits the element, else what its other facts, its
 * letter and its model say; a box when nothing does.
 */
export function elementKind(element: DeckElement, facts: ReadFacts, card: ModelCard | undefined): KindId {
  if (!isExamined(element) || element.letter === 'I') return 'box';
  const type = card && modelPolarity(card);
  const stated = kindOfWord(facts.kind);
  if (stated && fits(stated, element, type)) return stated;
  if (isContact(element, facts)) return 'plug-contact';
  if (element.letter === 'V') return sourceKind(element, facts);
  if (element.letter === 'C' && isPolarised(facts)) return 'polarised-capacitor';
  if (element.letter === 'D' && typeof facts.vz === 'number') return 'zener';
  return kindIds.find((id) => kindOf(id).deck.read?.(element, type)) ?? 'box';
}

/** Whether an element can be of a kind; the polarity of a transistor's own card is not argued with. */
function fits(kind: KindId, element: DeckElement, type: string | undefined): boolean {
  const { length } = kindOf(kind).pins;
  if (element.letter === 'X') return length >= 2 && length <= element.nodes.length;
  if (type !== undefined && 'MQ'.includes(element.letter) && type !== kind) return false;
  return kindsOfLetter[element.letter]?.includes(kind) ?? false;
}

/** Ohms up to which an element of a plug is one of its contacts. */
const contactOhms = 0.1;

/** A contact of a plug that says no more than which plug it is part of. */
function isContact({ letter, value }: DeckElement, { kind, part_of: of, internal, load }: ReadFacts): boolean {
  return letter === 'R' && value !== undefined && Math.abs(value) <= contactOhms && typeof of === 'string' && /^[JPX]/i.test(of)
    && kind === undefined && internal === undefined && load === undefined;
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
