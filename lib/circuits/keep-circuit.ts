import { inTransaction } from '@/db/transaction';
import { writeAudit } from '@/db/mutations/audit';
import { lockCircuit, renameCircuit, setArchived } from '@/db/mutations/circuits';
import type { CircuitAccess } from '@/lib/access/gates';
import { stillMay } from '@/lib/access/still-may';
import { entry, refuseArchived, type Act } from '@/lib/review/act';
import { rooms } from '@/lib/rooms/room-client';
import type { CircuitPatch } from '@/lib/schemas/circuit';

/** Renames a circuit, or brings it back from the archive. */
export async function patchCircuit(act: Act, access: CircuitAccess, patch: CircuitPatch): Promise<void> {
  await inTransaction(act.db, async (tx) => {
    const row = await lockCircuit(tx, access.circuit);
    if (patch.archived === false) {
      await stillMay(tx, act.person.id, ['archive the circuit'], access);
      if (row?.archivedAt) {
        await setArchived(tx, access.circuit, null);
        await writeAudit(tx, entry(act, access, 'restored the circuit', {}));
      }
    } else refuseArchived(row);
    if (patch.title === undefined) return;
    await stillMay(tx, act.person.id, ['edit the sheet'], access);
    await renameCircuit(tx, access.circuit, patch.title, act.now);
    await writeAudit(tx, entry(act, access, 'renamed the circuit', { title: patch.title }));
  });
  await rooms().revoke({ circuitId: access.circuit });
}

/** Archives a circuit: it leaves the list and takes no change until it is restored. Sent again it changes nothing. */
export async function archive(act: Act, access: CircuitAccess): Promise<void> {
  await inTransaction(act.db, async (tx) => {
    const row = await lockCircuit(tx, access.circuit);
    await stillMay(tx, act.person.id, ['archive the circuit'], access);
    if (!row || row.archivedAt !== null) return;
    await setArchived(tx, access.circuit, act.now);
    await writeAudit(tx, entry(act, access, 'archived the circuit', {}));
  });
  await rooms().revoke({ circuitId: access.circuit });
}
