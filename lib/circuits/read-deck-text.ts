import { ulid } from 'ulid';
import { Problem } from '@/lib/errors/problem';
import { netlistFromDeck, type DeckNetlist } from '@/lib/netlist/deck/netlist-from-deck';
import { readDeck } from '@/lib/netlist/deck/read-deck';
import type { Netlist } from '@/lib/netlist/netlist';
import { maxDeckBytes } from '@/lib/schemas/circuit';

/** The netlist of a deck. Throws `too-large`, or `deck-unreadable` with the first line that cannot be read and why. */
export function readDeckText(text: string): DeckNetlist {
  if (Buffer.byteLength(text) > maxDeckBytes) throw new Problem('too-large', 'A deck may have at most 256 KiB.');
  const reading = readDeck(text);
  if (reading.ok) return netlistFromDeck(reading.document);
  const [{ line, reason } = { line: 1, reason: 'It is empty.' }] = reading.errors;
  throw new Problem('deck-unreadable', `Line ${line}: ${reason}`, {
    line, reason, errors: reading.errors.map((error) => ({ path: `line ${error.line}`, message: error.reason })),
  });
}

/** The same netlist with ids of its own, for a sheet that is to live. */
export const withFreshIds = (netlist: Netlist): Netlist => ({ ...netlist, parts: netlist.parts.map((part) => ({ ...part, id: ulid() })) });
