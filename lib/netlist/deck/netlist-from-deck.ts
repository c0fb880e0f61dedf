import { addToList } from '../connectivity/add-to-list';
import { sortedByKey } from '../connectivity/sorted-by-key';
import type { KindId } from '../kinds/kind-id';
import { compareNetNames } from '../connectivity/drawn-nets';
import { pinReference } from '../connectivity/pin-reference';
import { compareDesignators } from '../designators/designator';
import { canonicalKindWord, kindOfWord } from './kind-word';
import type { DeckElement, Facts, FactValue, ModelCard, Net, Netlist, NetlistPart } from '../netlist';
import type { DeckDocument, DeckNotice } from './deck-document';
import { namedFacts, type NamedFacts } from './element-facts';
import { elementKind } from './element-kind';
import { elementPart } from './element-part';
import { boxPins, elementPins } from './element-pins';
import { libraryOf } from './library';
import { nameKey, nodeKey } from './names';
import { withoutRestated } from './new-in-deck';
import { nodeNames } from './node-names';

type ReadFacts = Readonly<Record<string, FactValue>>;

export interface DeckNetlist {
  readonly netlist: Netlist;
  /** Those of the reader, and what became of elements and facts that have no meaning here, by line. */
  readonly notices: readonly DeckNotice[];
}

/**
 * The netlist of a deck that was read: kinds from fact lines, models and waves, facts as ratings, nodes as nets. Designators
 * are the element names, or the `ref=` of their fact lines. A deck has no plan and no scenarios.
 */
export function netlistFromDeck(document: DeckDocument): DeckNetlist {
  const facts = namedFacts(document);
  const notices = [...document.notices, ...facts.notices];
  const names = nodeNames(document.elements, facts);
  const made = document.elements.map((element) => partOf(element, document, facts, notices));
  const parts = withIds(made.map((part) => ({ ...part, pins: mapValues(part.pins, (node) => names.get(nodeKey(node)) as string) })));
  const netlist: Netlist = {
    format: 1,
    title: document.title,
    parts,
    nets: netsOf(parts, names, facts),
    ...libraryOf(document, parts),
    scenarios: [],
    holdPoints: [],
  };
  return { netlist, notices: notices.sort((a, b) => a.line - b.line) };
}

function partOf(element: DeckElement, document: DeckDocument, named: NamedFacts, notices: DeckNotice[]): Omit<NetlistPart, 'id'> {
  const facts = named.elements.get(nameKey(element.name)) ?? {};
  const card = cardOf(element, document.models);
  const kind = elementKind(element, facts, card);
  const subcircuit = element.letter === 'X' ? findByName(document.subcircuits, element.model as string) : undefined;
  tell(element, kind, facts, card, notices);
  if (kind === 'box') return elementPart(element, kind, facts, boxPins(element, subcircuit));
  const { model, ...bare } = element;
  const known: DeckElement = card && model !== undefined ? element : bare;
  return withoutRestated(elementPart(known, kind, facts, elementPins(element, kind, facts, subcircuit)), element, card);
}

function tell(element: DeckElement, kind: KindId, facts: ReadFacts, card: ModelCard | undefined, notices: DeckNotice[]): void {
  const { line, name } = element;
  const stated = kindOfWord(facts.kind);
  if (stated && stated !== kind) {
    notices.push({ line, text: `${name}: kind=${String(facts.kind)} does not fit this element; it is kept as words and no rule uses it.` });
  }
  if ('DMQRCL'.includes(element.letter) && element.model !== undefined && !card) {
    notices.push({ line, text: `${name}: the deck has no model ${element.model} for it${kind === 'box' ? '; it stands as a box, not examined' : '; its facts are used'}.` });
  }
  if (element.letter === 'M' && kind !== 'box' && element.nodes[3] !== undefined && nodeKey(element.nodes[3]) !== nodeKey(element.nodes[2] as string)) {
    notices.push({ line, text: `${name}: its bulk is taken as joined to its source.` });
  }
}

/** Types of card that an element can have. */
const cardTypes: Readonly<Record<string, readonly string[]>> = {
  R: ['r'], C: ['c'], L: ['l'], D: ['d'], Q: ['npn', 'pnp'], M: ['nmos', 'pmos', 'vdmos'],
};

function cardOf({ letter, model }: DeckElement, models: readonly ModelCard[]): ModelCard | undefined {
  const card = model === undefined ? undefined : findByName(models, model);
  return card && cardTypes[letter]?.includes(card.type) ? card : undefined;
}

function findByName<T extends { readonly name: string }>(items: readonly T[], name: string): T | undefined {
  return items.find((item) => nameKey(item.name) === nameKey(name));
}

/** In canonical order, with ids derived from the designators; a doubled one is told apart by its place. */
function withIds(parts: readonly Omit<NetlistPart, 'id'>[]): NetlistPart[] {
  const used = new Map<string, number>();
  return [...parts].sort((a, b) => compareDesignators(a.ref, b.ref)).map((part) => {
    const base = `deck-${nameKey(part.ref)}`;
    const times = (used.get(base) ?? 0) + 1;
    used.set(base, times);
    return { id: times === 1 ? base : `${base}~${times}`, ...part };
  });
}

function netsOf(parts: readonly NetlistPart[], names: ReadonlyMap<string, string>, { nodes }: NamedFacts): Net[] {
  const pins = new Map<string, string[]>();
  for (const part of parts) {
    for (const [pin, net] of Object.entries(part.pins)) addToList(pins, net, pinReference(part, pin));
  }
  const keys = new Map([...names].map(([key, name]) => [name, key]));
  return [...pins].map(([name, members]): Net => {
    const { name: _name, ...facts } = nodes.get(keys.get(name) as string) ?? {};
    return { name, givenNames: isGiven(name) ? [name] : [], pins: members, facts: netFacts(facts) };
  }).sort((a, b) => compareNetNames(a.name, b.name));
}

/** Names such as N1 are what unnamed nets are called. */
function isGiven(name: string): boolean {
  return name !== '0' && !/^n[0-9]+$/i.test(name);
}

function netFacts(facts: Readonly<Record<string, FactValue>>): Facts {
  const kind = canonicalKindWord(facts.kind);
  return sortedByKey({ ...facts, ...(kind === undefined ? {} : { kind }) } as Facts);
}

function mapValues(record: Readonly<Record<string, string>>, map: (value: string) => string): Record<string, string> {
  return Object.fromEntries(Object.entries(record).map(([key, value]) => [key, map(value)]));
}

