import { ulid } from 'ulid';
import type { MessageId, ThreadId } from '@/db/authorized';
import type { Transaction } from '@/db/client';
import { inTransaction } from '@/db/transaction';
import { writeAudit } from '@/db/mutations/audit';
import { lockCircuit } from '@/db/mutations/circuits';
import { insertMessage, insertThread, lockThread, rewriteMessage } from '@/db/mutations/threads';
import { newestRevisionId } from '@/db/queries/threads';
import type { CircuitAccess, MessageAccess, ThreadAccess } from '@/lib/access/gates';
import { mintMessage, mintThread } from '@/lib/access/mint';
import { stillMay } from '@/lib/access/still-may';
import { Problem } from '@/lib/errors/problem';
import type { NewThread } from '@/lib/schemas/thread';
import { entry, refuseArchived, type Act } from './act';

/** Opens a margin note. It remembers the newest revision at that moment. */
export async function openNote(act: Act, access: CircuitAccess, input: NewThread): Promise<ThreadId> {
  const id = mintThread(ulid(act.now.getTime()));
  await inTransaction(act.db, async (tx) => {
    refuseArchived(await lockCircuit(tx, access.circuit));
    await stillMay(tx, act.person.id, ['write notes'], access);
    await insertThread(tx, {
      id, circuitId: access.circuit, anchor: input.anchor, mustAnswer: input.mustAnswer, status: 'open',
      openedBy: act.person.id, openedAt: act.now, revisionId: await newestRevisionId(tx, access.circuit),
    });
    await addMessage(tx, act, id, input.body);
    await writeAudit(tx, entry(act, access, 'wrote a note', { thread: id, anchor: input.anchor.kind, mustAnswer: input.mustAnswer }));
  });
  return id;
}

export async function reply(act: Act, access: ThreadAccess, body: string): Promise<MessageId> {
  return inTransaction(act.db, async (tx) => {
    refuseArchived(await lockCircuit(tx, access.circuit));
    await stillMay(tx, act.person.id, ['write notes'], access);
    if (!await lockThread(tx, access.thread)) throw new Problem('not-found');
    const id = await addMessage(tx, act, access.thread, body);
    await writeAudit(tx, entry(act, access, 'replied to a note', { thread: access.thread, message: id }));
    return id;
  });
}

export async function rewrite(act: Act, access: MessageAccess, body: string): Promise<void> {
  await inTransaction(act.db, async (tx) => {
    refuseArchived(await lockCircuit(tx, access.circuit));
    await stillMay(tx, act.person.id, ['edit own message'], { ...access, author: access.standing.author });
    await rewriteMessage(tx, access.message, body, act.now);
    await writeAudit(tx, entry(act, access, 'edited a message', { thread: access.thread, message: access.message }));
  });
}

/** Adds a message inside the caller's transaction. */
export async function addMessage(tx: Transaction, act: Act, thread: ThreadId, body: string): Promise<MessageId> {
  const id = mintMessage(ulid(act.now.getTime()));
  await insertMessage(tx, { id, threadId: thread, by: act.person.id, at: act.now, body });
  return id;
}
