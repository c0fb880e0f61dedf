import { asc, desc, eq, inArray } from 'drizzle-orm';
import type { CircuitId, MessageId, ThreadId } from '../authorized';
import type { Executor } from '../client';
import { revisions } from '../schema/revisions';
import { messages, threads } from '../schema/threads';

const columns = {
  id: threads.id, circuitId: threads.circuitId, anchor: threads.anchor, mustAnswer: threads.mustAnswer, status: threads.status,
  openedBy: threads.openedBy, openedAt: threads.openedAt, revisionId: threads.revisionId, letter: revisions.letter,
};
export type ThreadRow = Awaited<ReturnType<typeof threadsOf>>[number];

export async function threadsOf(db: Executor, circuit: CircuitId) {
  return db.select(columns).from(threads).leftJoin(revisions, eq(revisions.id, threads.revisionId))
    .where(eq(threads.circuitId, circuit)).orderBy(asc(threads.openedAt), asc(threads.id));
}

export async function threadRow(db: Executor, thread: ThreadId): Promise<ThreadRow | undefined> {
  const [row] = await db.select(columns).from(threads).leftJoin(revisions, eq(revisions.id, threads.revisionId)).where(eq(threads.id, thread));
  return row;
}

export async function messagesOf(db: Executor, threadIds: readonly string[]) {
  if (threadIds.length === 0) return [];
  return db.select({ id: messages.id, threadId: messages.threadId, by: messages.by, at: messages.at, body: messages.body, editedAt: messages.editedAt })
    .from(messages).where(inArray(messages.threadId, [...threadIds])).orderBy(asc(messages.at), asc(messages.id));
}

export async function messageRow(db: Executor, message: MessageId) {
  const [row] = await db.select({ id: messages.id, threadId: messages.threadId, by: messages.by, at: messages.at, body: messages.body, editedAt: messages.editedAt })
    .from(messages).where(eq(messages.id, message));
  return row;
}

/** Id of a circuit's newest revision. */
export async function newestRevisionId(db: Executor, circuit: CircuitId): Promise<string | null> {
  const [row] = await db.select({ id: revisions.id }).from(revisions).where(eq(revisions.circuitId, circuit)).orderBy(desc(revisions.number)).limit(1);
  return row?.id ?? null;
}
