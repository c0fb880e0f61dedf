import { ulid } from 'ulid';
import type { CircuitId } from '@/db/authorized';
import { inTransaction } from '@/db/transaction';
import { writeAudit } from '@/db/mutations/audit';
import { discardCircuit, insertCircuit, nameMakers } from '@/db/mutations/circuits';
import { createRoom } from '@/db/mutations/room-create';
import { benchRole } from '@/db/queries/people';
import { circuitFacts } from '@/db/queries/standing';
import type { BenchAccess } from '@/lib/access/gates';
import { mintCircuit } from '@/lib/access/mint';
import { refuseUnless } from '@/lib/access/refuse';
import { placeNetlist } from '@/lib/document/place/place-netlist';
import type { Sheet } from '@/lib/document/records';
import { Problem } from '@/lib/errors/problem';
import { first, repeat, type Act, type Outcome } from '@/lib/review/act';
import { editSheet, type Editor } from '@/lib/rooms/edit-sheet';
import { readLiveSheet } from '@/lib/rooms/live-sheet';
import type { NewCircuit } from '@/lib/schemas/circuit';
import { readDeckText, withFreshIds } from './read-deck-text';

/**
 * Posts a circuit, empty or from a deck whose parts are placed and wired. The poster is its maker. A deck is taken whole or
 * not at all: one that cannot be read or stored leaves no circuit behind.
 */
export async function postCircuit(act: Act, access: BenchAccess, input: NewCircuit): Promise<Outcome<CircuitId>> {
  const sheet = input.deck === undefined ? undefined : await sheetOfDeck(input.deck, input.title);
  return postSheet(act, access, input.title, sheet);
}

const sheetOfDeck = async (deck: string, title: string): Promise<Sheet> => (
  { ...await placeNetlist(withFreshIds(readDeckText(deck).netlist), () => ulid()), title }
);

/** Posts a circuit with a sheet that is drawn already. Taken up again after it was cut off, it draws what was not drawn yet. */
export async function postSheet(act: Pick<Act, 'db' | 'requestId' | 'now' | 'thing'> & { readonly person: Editor }, access: BenchAccess, title: string, sheet?: Sheet): Promise<Outcome<CircuitId>> {
  const circuit = mintCircuit(act.thing ?? ulid(act.now.getTime()));
  const isNew = await inTransaction(act.db, async (tx) => {
    const membership = await benchRole(tx, access.slug, act.person.id);
    if (!membership) throw new Problem('not-found');
    refuseUnless(['post a circuit'], { role: membership.role });
    if (act.thing !== undefined && await circuitFacts(tx, circuit)) return false;
    await insertCircuit(tx, { id: circuit, bench: access.bench, title, postedBy: act.person.id, now: act.now });
    await nameMakers(tx, circuit, [{ id: ulid(act.now.getTime()), personId: act.person.id }], act.now);
    await createRoom(tx, circuit);
    await writeAudit(tx, { bench: access.bench, circuit, actor: act.person.id, action: 'posted the circuit', detail: { title, deck: sheet !== undefined }, requestId: act.requestId });
    return true;
  });
  const answer = isNew ? first(circuit) : repeat(circuit);
  if (sheet === undefined || (!isNew && (await readLiveSheet(act.db, circuit)).seq > 0)) return answer;
  try {
    await editSheet(act.db, circuit, act.person, () => sheet);
  } catch (error) {
    await inTransaction(act.db, (tx) => discardCircuit(tx, circuit));
    throw error;
  }
  return answer;
}
