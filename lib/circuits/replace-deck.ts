import { ulid } from 'ulid';
import { inTransaction } from '@/db/transaction';
import { writeAudit } from '@/db/mutations/audit';
import { touchCircuit } from '@/db/mutations/circuits';
import type { CircuitAccess } from '@/lib/access/gates';
import { replaceByDeck } from '@/lib/document/place/replace-by-deck';
import { Problem } from '@/lib/errors/problem';
import { entry, type Act } from '@/lib/review/act';
import { editSheet } from '@/lib/rooms/edit-sheet';
import { readDeckText, withFreshIds } from './read-deck-text';

/**
 * Replaces parts, wires and net names by a deck, as one edit of the caller. Plan, scenarios, title and threads stay; a part
 * whose designator is in both keeps its id and, where it can, its place. A deck that cannot be read changes nothing.
 */
export async function replaceDeck(act: Act, access: CircuitAccess, deck: string): Promise<void> {
  const { netlist } = readDeckText(deck);
  if (access.archived) throw new Problem('archived');
  const seq = await editSheet(act.db, access.circuit, act.person, (sheet) => replaceByDeck(sheet, withFreshIds(netlist), () => ulid()));
  await inTransaction(act.db, async (tx) => {
    await touchCircuit(tx, access.circuit, act.now);
    await writeAudit(tx, entry(act, access, 'replaced the sheet by a deck', { seq }));
  });
}
