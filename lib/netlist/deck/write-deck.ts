import { kindOf } from '../kinds/kind-registry';
import type { FactValue, Net, Netlist, NetlistPart } from '../netlist';
import { deckNames, type DeckNames } from './deck-names';
import { cardLine, subcircuitLines } from './element-text';
import { factLines } from './fact-words';
import { missingValue } from './read-fact-line';

/**
 * The netlist as a SPICE deck of Berkeley elements, to run anywhere, with fact lines for all that SPICE has no words for
 * (`docs/rules.md`, "Designators"). Read again it gives the same connectivity, values and facts; plan, scenarios, placement, test points
 * and marks are not in a deck.
 */
export function writeDeck(netlist: Netlist): string {
  const names = deckNames(netlist);
  const node = (net: string) => names.nodes.get(net) as string;
  const lines = [
    title(netlist.title),
    ...netlist.nets.flatMap((net) => factLines(node(net.name), netFacts(net, node(net.name)))),
    ...netlist.parts.flatMap((part) => partLines(part, names, node)),
    ...netlist.models.map(cardLine),
    ...netlist.subcircuits.flatMap(subcircuitLines),
    ...(netlist.models.length === 0 ? ['.options temp=25 tnom=25'] : []),
    '.op',
    '.end',
  ];
  return `${lines.join('\n')}\n`;
}

/** Line 1 is the title whatever it says; an empty one would let the first element be it. */
function title(text: string): string {
  return text.replace(/\p{Cc}+/gu, ' ').trim() || 'Untitled';
}

function netFacts(net: Net, node: string): Readonly<Record<string, FactValue>> {
  return { ...net.facts, ...(node === net.name ? {} : { name: net.name }) };
}

function partLines(part: NetlistPart, names: DeckNames, node: (net: string) => string): string[] {
  const name = names.elements.get(part.id);
  if (name === undefined) return [];
  const lines = kindOf(part.kind).deck.write(part, name, node);
  return [...lines, ...factLines(name, partFacts(part, name, node, lines[0] as string))];
}

/** Facts of a part's line: what the element does not say by itself. */
function partFacts(
  part: NetlistPart, name: string, node: (net: string) => string, element: string,
): Record<string, FactValue | undefined> {
  const { deck } = kindOf(part.kind);
  const facts: Record<string, FactValue | undefined> = { ...part.facts };
  const isBox = part.kind === 'box';
  const carriesValue = isBox || deck.placeholder !== undefined;
  if (carriesValue) facts.value = isBox ? undefined : writtenValue(part, element);
  if (isBox) facts.element = facts.text = undefined;
  return {
    kind: part.facts.kind ?? (isBox ? undefined : part.kind),
    ref: name === part.ref ? undefined : part.ref,
    pins: deck.letterOf(part) === 'X' && !isBox ? pinsFact(part, node) : undefined,
    ...withoutKind(facts),
    polarised: part.kind === 'polarised-capacitor' && part.facts.kind !== undefined ? true : facts.polarised,
    ...(part.kind === 'plug-contact' ? { part_of: part.facts.part_of ?? part.ref } : {}),
  };
}

function withoutKind({ kind: _kind, ...facts }: Record<string, FactValue | undefined>): Record<string, FactValue | undefined> {
  return facts;
}

/** The element has the number, or a wave alone; `missing` says that nobody gave it. */
function writtenValue({ facts, model }: NetlistPart, element: string): FactValue | undefined {
  if (typeof facts.value === 'number' || model !== undefined) return undefined;
  return / (?:SIN|PULSE|EXP|PWL)\(/.test(element) ? undefined : missingValue;
}

/** `D:drain,G:gate,S:0`: nodes are plain names, so that nothing in them can be a comma or a colon. */
function pinsFact(part: NetlistPart, node: (net: string) => string): string {
  return Object.entries(part.pins).map(([pin, net]) => `${pin}:${node(net)}`).join(',');
}
