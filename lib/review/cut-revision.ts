import { ulid } from 'ulid';
import type { Transaction } from '@/db/client';
import { isDuplicate } from '@/db/errors';
import { inTransaction } from '@/db/transaction';
import { writeAudit } from '@/db/mutations/audit';
import { lockCircuit, touchCircuit } from '@/db/mutations/circuits';
import {
  insertContributors, insertFindings, insertHoldPoints, insertNetlistRows, insertRevision, newestNumber,
} from '@/db/mutations/revisions';
import { allMakersOf, circuitTitle } from '@/db/queries/circuits';
import { readRoomContributors } from '@/db/queries/room-contributors';
import { revisionAtSeq } from '@/db/queries/revisions';
import type { CircuitAccess } from '@/lib/access/gates';
import { mintRevision } from '@/lib/access/mint';
import { stillMay } from '@/lib/access/still-may';
import { presentationHash, sheetToNetlist } from '@/lib/document/nets/sheet-to-netlist';
import { Problem } from '@/lib/errors/problem';
import { contentHash } from '@/lib/netlist/hash';
import { revisionLetter } from '@/lib/netlist/designators/revision-letter';
import type { Netlist } from '@/lib/netlist/netlist';
import { readLiveSheet, type LiveSheet } from '@/lib/rooms/live-sheet';
import type { Cut } from '@/lib/schemas/revision';
import { entry, first, refuseArchived, repeat, type Act, type Outcome } from './act';
import { checkCopy, type CheckedCopy } from './check-copy';
import { withinPatience } from './check-on-server';

/**
 * Cuts a revision: a full copy of the committed sheet at one seq, its netlist as rows, and what the server's own checks say of
 * exactly that copy. Findings never stop a cut. Cut twice at one seq it answers the first. Throws `sheet-moved` when
 * `seq` is given and is not the head.
 */
export async function cutRevision(act: Act, access: CircuitAccess, input: Cut): Promise<Outcome<string>> {
  if (access.archived) throw new Problem('archived');
  const live = await readLiveSheet(act.db, access.circuit);
  const earlier = await revisionAtSeq(act.db, access.circuit, input.seq ?? live.seq);
  const moved = input.seq !== undefined && input.seq !== live.seq;
  // The very same cut sent again has its answer, also when the sheet has moved on since.
  if (earlier && (!moved || (earlier.cutBy === act.person.id && earlier.note === input.note))) return repeat(earlier.id);
  if (moved) {
    throw new Problem('sheet-moved', `You looked at change ${input.seq}; the sheet is at change ${live.seq}.`);
  }
  const netlist = sheetToNetlist(live.sheet, await circuitTitle(act.db, access.circuit) ?? live.sheet.title);
  const checked = await withinPatience(checkCopy(netlist));
  try {
    return await inTransaction(act.db, (tx) => store(tx, act, access, input, live, netlist, checked));
  } catch (error) {
    const other = isDuplicate(error) ? await revisionAtSeq(act.db, access.circuit, live.seq) : undefined;
    if (other) return repeat(other.id);
    throw error;
  }
}

async function store(
  tx: Transaction, act: Act, access: CircuitAccess, input: Cut, live: LiveSheet, netlist: Netlist, checked: CheckedCopy,
): Promise<Outcome<string>> {
  refuseArchived(await lockCircuit(tx, access.circuit));
  await stillMay(tx, act.person.id, ['cut a revision'], access);
  const earlier = await revisionAtSeq(tx, access.circuit, live.seq);
  if (earlier) return repeat(earlier.id);

  const number = await newestNumber(tx, access.circuit) + 1;
  const id = mintRevision(ulid(act.now.getTime()));
  const letter = revisionLetter(number);
  const hash = contentHash(netlist);
  await insertRevision(tx, {
    id, circuitId: access.circuit, number, letter, seq: live.seq, contentHash: hash, presentationHash: presentationHash(live.sheet),
    netlist, sheet: live.bytes, note: input.note, cutBy: act.person.id, cutAt: act.now, rules: checked.rules, volts: checked.volts,
  });
  await insertNetlistRows(tx, id, netlist);
  await insertHoldPoints(tx, id, netlist.holdPoints, checked.sourceKnown);
  await insertFindings(tx, id, checked.findings);
  const [editors, makers] = await Promise.all([readRoomContributors(tx, access.circuit), allMakersOf(tx, access.circuit)]);
  await insertContributors(tx, id, [...new Set([...editors, ...makers])]);
  await touchCircuit(tx, access.circuit, act.now);
  await writeAudit(tx, entry(act, access, 'cut a revision', { revision: id, letter, seq: live.seq, contentHash: hash }));
  return first(id);
}
