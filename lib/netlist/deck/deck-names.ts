import type { Netlist, NetlistPart } from '../netlist';
import { kindOf } from '../kinds/kind-registry';
import { nameKey } from './names';

/** Names that no other SPICE reads as anything but a name. */
const plain = /^[A-Za-z0-9_+.#-]+$/;
const longest = 40;

/** Makes names that are plain, not too long and different from all before, without regard to case. */
class NameMaker {
  constructor(private readonly taken: Set<string>) {}

  name(wanted: string): string {
    const base = (plain.test(wanted) ? wanted : wanted.replace(/[^A-Za-z0-9_+.#-]/g, '_')).slice(0, longest) || '_';
    let name = base;
    for (let number = 2; this.taken.has(nameKey(name)); number++) name = `${base.slice(0, longest - 6)}_${number}`;
    this.taken.add(nameKey(name));
    return name;
  }
}

export interface DeckNames {
  /** Element name of each part that leaves an element, by part id. */
  readonly elements: ReadonlyMap<string, string>;
  /** Node of each net, by net name. */
  readonly nodes: ReadonlyMap<string, string>;
}

/**
 * Names of a written deck. An element is called by its designator, with its letter put before one that lacks it; contacts of a plug
 * carry their number. No node is called like an element, for a fact line of that name would go to the element.
 */
export function deckNames(netlist: Netlist): DeckNames {
  const maker = new NameMaker(new Set(['0', 'gnd']));
  const elements = new Map<string, string>();
  for (const part of netlist.parts) {
    const letter = kindOf(part.kind).deck.letterOf(part);
    if (letter !== null) elements.set(part.id, maker.name(elementName(part, letter)));
  }
  const nodes = new Map(netlist.nets.map(({ name }) => [name, name === '0' ? '0' : maker.name(name)]));
  return { elements, nodes };
}

function elementName(part: NetlistPart, letter: string): string {
  const contact = part.kind === 'plug-contact' && part.facts.contact !== undefined ? `_${String(part.facts.contact)}` : '';
  const ref = part.ref.toUpperCase().startsWith(letter) ? part.ref : `${letter}${part.ref}`;
  return `${ref}${contact}`;
}
