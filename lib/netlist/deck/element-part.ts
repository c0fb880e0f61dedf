import { closedOhms, openOhms } from '../kinds/element-line';
import type { KindId } from '../kinds/kind-id';
import { kindOf } from '../kinds/kind-registry';
import type { DeckElement, Facts, FactValue, NetlistPart } from '../netlist';
import { sortedByKey } from '../connectivity/sorted-by-key';
import { isExamined } from './deck-document';
import { deckLimits } from './deck-limits';
import { canonicalKindWord, kindOfWord } from './kind-word';
import { missingValue } from './read-fact-line';

type ReadFacts = Readonly<Record<string, FactValue>>;
type MutableFacts = Record<string, FactValue | undefined>;

/** Facts that say how an element is joined or called; once the part is made they are said by its pins and designator. */
const joining = ['ref', 'pins', 'plus', 'minus', 'anode', 'cathode'];

/** A part of an element, without an id, with nodes in place of nets. The model stays until it is known to say something new. */
export function elementPart(element: DeckElement, kind: KindId, facts: ReadFacts, pins: Readonly<Record<string, string>>): Omit<NetlistPart, 'id'> {
  const own: MutableFacts = { ...facts, kind: remainingKind(facts.kind, kind) };
  const ref = typeof facts.ref === 'string' && facts.ref.length <= deckLimits.name ? facts.ref : element.name;
  for (const fact of joining) own[fact] = undefined;
  if (kind === 'polarised-capacitor') own.polarised = undefined;
  if (kind === 'plug-contact' && own.part_of === ref) own.part_of = undefined;
  addValue(own, element, kind);
  // Width and length mean nothing to a transistor whose model is made from its ratings.
  const isRated = element.letter === 'M' && element.model === undefined;
  const isWhole = element.letter === 'X' && kind !== 'box';
  return {
    ref,
    kind,
    pins,
    facts: sortedByKey(own as Facts),
    origins: {},
    ...(element.wave ? { wave: element.wave } : {}),
    ...(element.model === undefined || isWhole ? {} : { model: element.model }),
    ...(Object.keys(element.params).length > 0 && !isRated ? { params: sortedByKey(element.params) } : {}),
    leftOpen: [],
  };
}

/** A `kind=` that became the part's kind is said by it; any other stays as a label. */
function remainingKind(word: FactValue | undefined, kind: KindId): FactValue | undefined {
  return kindOfWord(word) === kind ? undefined : (canonicalKindWord(word) ?? word);
}

function addValue(facts: MutableFacts, element: DeckElement, kind: KindId): void {
  const isMissing = facts.value === missingValue;
  if (kind === 'box') {
    facts.element = element.letter;
    facts.text = isExamined(element) ? undefined : element.text || undefined;
    facts.value = element.value;
  } else if (kindOf(kind).deck.placeholder !== undefined) {
    const stated = typeof facts.value === 'number' ? facts.value : undefined;
    facts.value = isMissing ? undefined : (element.value ?? stated);
  } else if (element.letter === 'R') addContact(facts, element.value, kind);
  if (kind === 'switch') facts.closed_switch ??= false;
  if (kind === 'ac-mains' && element.wave) addMains(facts, element.wave.args);
}

/** Volts rms and hertz of a plain sine, which is how a form states mains. */
function addMains(facts: MutableFacts, [offset = 0, amplitude = 0, hertz, ...more]: readonly number[]): void {
  if (offset !== 0 || hertz === undefined || more.some((number) => number !== 0)) return;
  facts.rms ??= Math.abs(amplitude) / Math.SQRT2;
  facts.f ??= hertz;
}

/** Ohms of an element that is a lead, contact, switch or fuse: its own resistance, and for a switch whether it is drawn closed. */
function addContact(facts: MutableFacts, ohms: number | undefined, kind: KindId): void {
  if (ohms === undefined) return;
  const isOpen = kind === 'switch' && ohms >= openOhms / 1e6;
  if (kind === 'switch') facts.closed_switch ??= !isOpen;
  if (!isOpen && ohms !== closedOhms) facts.rs ??= ohms;
}
