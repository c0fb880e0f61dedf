import { readDeck } from '@/lib/netlist/deck/read-deck';
import type { DeckDocument } from '@/lib/netlist/deck/deck-document';

/** A deck of the tests' own, as the product's reader understands it. */
export function readTestDeck(lines: readonly string[]): DeckDocument {
  const reading = readDeck(['reference', ...lines, '.end', ''].join('\n'));
  if (!reading.ok) throw new Error(reading.errors.map(({ line, reason }) => `line ${line}: ${reason}`).join('; '));
  return reading.document;
}
