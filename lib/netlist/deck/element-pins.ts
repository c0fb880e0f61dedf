import type { KindId } from '../kinds/kind-id';
import { kindOf } from '../kinds/kind-registry';
import type { DeckElement, FactValue, Subcircuit } from '../netlist';
import { deckLimits } from './deck-limits';
import { nodeKey } from './names';

type ReadFacts = Readonly<Record<string, FactValue>>;

/** Which facts say which end a node is. */
const endFacts: readonly (readonly [fact: string, pin: string])[] = [['plus', '+'], ['minus', '-'], ['anode', 'A'], ['cathode', 'K']];

/** Pin → node of a part, in the order of its kind; a fact that names a node the element does not have counts for nothing. */
export function elementPins(element: DeckElement, kind: KindId, facts: ReadFacts, subcircuit: Subcircuit | undefined): Record<string, string> {
  const names = kindOf(kind).pins.map((pin) => pin.name);
  const stated = statedPins(element, facts);
  const order = pinOrder(element, kind, subcircuit);
  const byPosition = new Map(order.map((pin, index) => [pin, element.nodes[index]]));
  const pins = names.map((pin) => [pin, stated.get(pin.toUpperCase()) ?? byPosition.get(pin)] as const);
  const ends = endFacts.filter(([fact, pin]) => names.includes(pin) && facts[fact] !== undefined);
  if (names.length !== 2 || ends.length === 0) return Object.fromEntries(pins) as Record<string, string>;
  return twoEnds(element, names as [string, string], ends, facts, Object.fromEntries(pins) as Record<string, string>);
}

/** Names of a subcircuit's pins where they are those of the kind, else the order of the kind. */
function pinOrder(element: DeckElement, kind: KindId, subcircuit: Subcircuit | undefined): readonly string[] {
  const { pins, deck } = kindOf(kind);
  const formal = element.letter === 'X' ? (subcircuit?.pins.map((pin) => pin.toUpperCase()) ?? []) : [];
  return pins.every(({ name }) => formal.includes(name)) ? formal : deck.pinOrder;
}

/** `pins=D:0,G:g,S:s` as pin → node of the element, pins in upper case. */
function statedPins(element: DeckElement, facts: ReadFacts): Map<string, string> {
  const stated = new Map<string, string>();
  if (typeof facts.pins !== 'string') return stated;
  for (const pair of facts.pins.split(',')) {
    const colon = pair.indexOf(':');
    const node = element.nodes.find((candidate) => nodeKey(candidate) === nodeKey(pair.slice(colon + 1).trim()));
    if (colon > 0 && node !== undefined) stated.set(pair.slice(0, colon).trim().toUpperCase(), node);
  }
  return stated;
}

/** The named end is on the named node and the other pin on the other one. */
function twoEnds(
  element: DeckElement, names: readonly [string, string], ends: readonly (readonly [string, string])[], facts: ReadFacts, pins: Record<string, string>,
): Record<string, string> {
  for (const [fact, pin] of ends) {
    const index = element.nodes.findIndex((node) => typeof facts[fact] === 'string' && nodeKey(node) === nodeKey(facts[fact]));
    if (index !== 0 && index !== 1) continue;
    const other = names[0] === pin ? names[1] : names[0];
    const placed: Record<string, string> = { [pin]: element.nodes[index] as string, [other]: element.nodes[1 - index] as string };
    return Object.fromEntries(names.map((name) => [name, placed[name] as string]));
  }
  return pins;
}

/** Pins of a box: those of its subcircuit, + and − of a current source, or numbers. */
export function boxPins(element: DeckElement, subcircuit: Subcircuit | undefined): Record<string, string> {
  const formal = element.letter === 'I' ? ['+', '-'] : (subcircuit?.pins ?? []);
  const isNamed = new Set(formal).size === element.nodes.length && formal.every(({ length }) => length <= deckLimits.pinName);
  const names = isNamed ? formal : element.nodes.map((_, index) => String(index + 1));
  return Object.fromEntries(element.nodes.map((node, index) => [names[index] as string, node]));
}
