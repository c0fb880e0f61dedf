import { inTransaction } from '@/db/transaction';
import { writeAudit } from '@/db/mutations/audit';
import { lockCircuit } from '@/db/mutations/circuits';
import { lockThread, setThreadStatus } from '@/db/mutations/threads';
import { contributesTo } from '@/db/queries/standing';
import type { ThreadAccess } from '@/lib/access/gates';
import type { Action } from '@/lib/access/rights';
import { stillMay } from '@/lib/access/still-may';
import { Problem } from '@/lib/errors/problem';
import type { ThreadPatch, ThreadState } from '@/lib/schemas/thread';
import { entry, refuseArchived, type Act } from './act';
import { addMessage } from './write-note';

/** Where a note may go from where it is. A resolved one is opened again before anything else. */
const next: Readonly<Record<ThreadState, readonly ThreadState[]>> = {
  open: ['answered', 'resolved'], answered: ['open', 'resolved'], resolved: ['open'],
};

function actionFor(status: ThreadState, mustAnswer: boolean): Action {
  if (status === 'answered') return 'say a note is answered';
  if (status === 'open') return 'write notes';
  return mustAnswer ? 'resolve a note that must be answered' : 'resolve a note';
}

/** Moves a note on: a maker says it is answered, its author or whoever the table of rights names resolves it, anyone opens it again. */
export async function moveNote(act: Act, access: ThreadAccess, { status, body }: ThreadPatch): Promise<void> {
  await inTransaction(act.db, async (tx) => {
    refuseArchived(await lockCircuit(tx, access.circuit));
    const row = await lockThread(tx, access.thread);
    if (!row) throw new Problem('not-found');
    await stillMay(tx, act.person.id, [actionFor(status, row.mustAnswer)], {
      ...access, author: row.openedBy === act.person.id, contributor: await contributesTo(tx, access.circuit, act.person.id),
    });
    if (row.status !== status) {
      if (!next[row.status].includes(status)) throw new Problem('thread-state', `The note is ${row.status}.`);
      await setThreadStatus(tx, access.thread, status, status === 'resolved' ? { by: act.person.id, at: act.now } : null);
      await writeAudit(tx, entry(act, access, `set a note ${status}`, { thread: access.thread, from: row.status }));
    }
    if (body !== undefined) await addMessage(tx, act, access.thread, body);
  });
}
