import { deckLimits } from './deck-limits';
import { DeckRefusal } from './deck-refusal';

/** Refuses a name that is longer than names may be. */
export function checkName(name: string, what: string, line: number): void {
  if (name.length > deckLimits.name) throw new DeckRefusal(line, `${what} has a name longer than ${deckLimits.name} characters.`);
}

/** Key under which element, model and node names are compared: SPICE knows no case. */
export function nameKey(name: string): string {
  return name.toLowerCase();
}

/** Key of a node; `gnd` is node 0 in every SPICE. */
export function nodeKey(node: string): string {
  const key = nameKey(node);
  return key === 'gnd' ? '0' : key;
}
