import type { DeckElement } from '../netlist';
import type { DeckNotice } from './deck-document';
import { DeckRefusal } from './deck-refusal';

/** Nodes of elements that are not examined yet, by letter. */
const nodeCounts: Readonly<Record<string, number>> = {
  E: 4, G: 4, F: 2, H: 2, B: 2, S: 4, W: 2, J: 3, Z: 3, T: 4, O: 4, U: 3, P: 2, N: 2, Y: 2, K: 0, A: 0,
};

/** An element that is kept as a box: its nodes by its letter, the rest as written. */
export function unexaminedElement(letter: string, name: string, text: string, line: number, notices: DeckNotice[]): DeckElement {
  if (!/^[A-Z]$/.test(letter)) throw new DeckRefusal(line, `${text.slice(0, 20)} is neither an element nor a statement of a deck.`);
  const words = text.slice(name.length).trim().split(/\s+/).filter((word) => word !== '');
  const count = nodeCounts[letter] ?? 0;
  if (words.length < count) throw new DeckRefusal(line, `${name} has too few nodes: it takes ${count}.`);
  notices.push({ line, text: `${name} is not examined: elements ${letter} are not read yet. It stands as a box.` });
  return { letter, name, nodes: words.slice(0, count), params: {}, text: words.slice(count).join(' '), line };
}
