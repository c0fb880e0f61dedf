import { ulid } from 'ulid';
import type { MessageId, ThreadId } from '@/db/authorized';
import type { Transaction } from '@/db/client';
import { inTransaction } from '@/db/transaction';
import { writeAudit } from '@/db/mutations/audit';
import { lockCircuit } from '@/db/mutations/circuits';
import { insertMessage, insertThread, lockThread, rewriteMessage } from '@/db/mutations/threads';
import { placeOfMessage, placeOfThread } from '@/db/queries/standing';
import { newestRevisionId } from '@/db/queries/threads';
import type { CircuitAccess, MessageAccess, ThreadAccess } from '@/lib/access/gates';
import { mintMessage, mintThread } from '@/lib/access/mint';
import { stillMay } from '@/lib/access/still-may';
import { Problem } from '@/lib/errors/problem';
import type { NewThread } from '@/lib/schemas/thread';
import { entry, first, refuseArchived, repeat, type Act, type Outcome } from './act';

/** Opens a margin note. It remembers the newest revision at that moment. */
export async function openNote(act: Act, access: CircuitAccess, input: NewThread): Promise<Outcome<ThreadId>> {
  const id = mintThread(act.thing ?? ulid(act.now.getTime()));
  return inTransaction(act.db, async (tx) => {
    refuseArchived(await lockCircuit(tx, access.circuit));
    await stillMay(tx, act.person.id, ['write notes'], access);
    if (act.thing !== undefined && await placeOfThread(tx, id)) return repeat(id);
    await insertThread(tx, {
      id, circuitId: access.circuit, anchor: input.anchor, mustAnswer: input.mustAnswer, status: 'open',
      openedBy: act.person.id, openedAt: act.now, revisionId: await newestRevisionId(tx, access.circuit),
    });
    await addMessage(tx, { ...act, thing: undefined }, id, input.body);
    await writeAudit(tx, entry(act, access, 'wrote a note', { thread: id, anchor: input.anchor.kind, mustAnswer: input.mustAnswer }));
    return first(id);
  });
}

export async function reply(act: Act, access: ThreadAccess, body: string): Promise<Outcome<MessageId>> {
  return inTransaction(act.db, async (tx) => {
    refuseArchived(await lockCircuit(tx, access.circuit));
    await stillMay(tx, act.person.id, ['write notes'], access);
    if (!await lockThread(tx, access.thread)) throw new Problem('not-found');
    const message = await addMessage(tx, act, access.thread, body);
    if (message.first) await writeAudit(tx, entry(act, access, 'replied to a note', { thread: access.thread, message: message.value }));
    return message;
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

/** Adds a message inside the caller's transaction, unless this act has added it before. */
export async function addMessage(tx: Transaction, act: Act, thread: ThreadId, body: string): Promise<Outcome<MessageId>> {
  const id = mintMessage(act.thing ?? ulid(act.now.getTime()));
  if (act.thing !== undefined && await placeOfMessage(tx, id)) return repeat(id);
  await insertMessage(tx, { id, threadId: thread, by: act.person.id, at: act.now, body });
  return first(id);
}
