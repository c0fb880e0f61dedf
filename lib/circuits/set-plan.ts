import { ulid } from 'ulid';
import { inTransaction } from '@/db/transaction';
import { writeAudit } from '@/db/mutations/audit';
import { touchCircuit } from '@/db/mutations/circuits';
import type { CircuitAccess } from '@/lib/access/gates';
import { Problem } from '@/lib/errors/problem';
import type { HoldPoint } from '@/lib/netlist/netlist';
import { entry, type Act } from '@/lib/review/act';
import { editSheet } from '@/lib/rooms/edit-sheet';
import type { Plan } from '@/lib/schemas/hold-point';
import { liveNetlist } from './live-netlist';
import { withPlan } from './plan-edit';

/** Sets the power-up plan as one edit of the caller and answers it as it stands after the commit. */
export async function setPlan(act: Act, access: CircuitAccess, plan: Plan): Promise<readonly HoldPoint[]> {
  if (access.archived) throw new Problem('archived');
  const seq = await editSheet(act.db, access.circuit, act.person, (sheet) => withPlan(sheet, plan, () => ulid()));
  await inTransaction(act.db, async (tx) => {
    await touchCircuit(tx, access.circuit, act.now);
    await writeAudit(tx, entry(act, access, 'set the power-up plan', { seq, holdPoints: plan.map(({ name }) => name) }));
  });
  return (await liveNetlist(act.db, access)).netlist.holdPoints;
}
