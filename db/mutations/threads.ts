import { eq } from 'drizzle-orm';
import type { ThreadState } from '@/lib/schemas/thread';
import type { MessageId, ThreadId } from '../authorized';
import type { Transaction } from '../client';
import { messages, threads } from '../schema/threads';

export async function insertThread(tx: Transaction, row: typeof threads.$inferInsert): Promise<void> {
  await tx.insert(threads).values(row);
}

export async function insertMessage(tx: Transaction, row: typeof messages.$inferInsert): Promise<void> {
  await tx.insert(messages).values(row);
}

/** Holds a thread until the transaction ends and answers how it stands. */
export async function lockThread(tx: Transaction, thread: ThreadId) {
  const [row] = await tx.select({ status: threads.status, mustAnswer: threads.mustAnswer, openedBy: threads.openedBy })
    .from(threads).where(eq(threads.id, thread)).for('update');
  return row;
}

export async function setThreadStatus(tx: Transaction, thread: ThreadId, status: ThreadState, resolved: { by: string; at: Date } | null): Promise<void> {
  await tx.update(threads).set({ status, resolvedBy: resolved?.by ?? null, resolvedAt: resolved?.at ?? null }).where(eq(threads.id, thread));
}

export async function rewriteMessage(tx: Transaction, message: MessageId, body: string, editedAt: Date): Promise<void> {
  await tx.update(messages).set({ body, editedAt }).where(eq(messages.id, message));
}
