import type { Executor } from '@/db/client';
import { namesOf } from '@/db/queries/names';
import { messageRow, messagesOf, threadRow, threadsOf, type ThreadRow } from '@/db/queries/threads';
import type { CircuitAccess, MessageAccess, ThreadAccess } from '@/lib/access/gates';
import { Problem } from '@/lib/errors/problem';
import type { Message, Thread } from '@/lib/schemas/thread';
import { namingFor } from './naming';
import type { Naming } from './review-view';

type MessageRow = Awaited<ReturnType<typeof messagesOf>>[number];

const messageView = (row: MessageRow, who: Naming): Message => (
  { id: row.id, by: who(row.by), at: row.at.toISOString(), body: row.body, editedAt: row.editedAt?.toISOString() ?? null }
);

async function views(db: Executor, rows: readonly ThreadRow[], access: CircuitAccess): Promise<Thread[]> {
  const messages = await messagesOf(db, rows.map(({ id }) => id));
  const who = namingFor(access.standing)(await namesOf(db, [...rows.map(({ openedBy }) => openedBy), ...messages.map(({ by }) => by)]));
  return rows.map((row) => ({
    id: row.id, circuitId: row.circuitId, anchor: row.anchor, status: row.status, mustAnswer: row.mustAnswer,
    by: who(row.openedBy), at: row.openedAt.toISOString(),
    revision: row.revisionId === null ? null : { id: row.revisionId, letter: row.letter ?? '' },
    messages: messages.filter(({ threadId }) => threadId === row.id).map((message) => messageView(message, who)),
  }));
}

/** A circuit's margin notes, oldest first. */
export const listThreadViews = async (db: Executor, access: CircuitAccess): Promise<Thread[]> => views(db, await threadsOf(db, access.circuit), access);

export async function threadView(db: Executor, access: ThreadAccess): Promise<Thread> {
  const row = await threadRow(db, access.thread);
  const [view] = row ? await views(db, [row], access) : [];
  if (!view) throw new Problem('not-found');
  return view;
}

export async function messageViewOf(db: Executor, access: MessageAccess): Promise<Message> {
  const row = await messageRow(db, access.message);
  if (!row) throw new Problem('not-found');
  return messageView(row, namingFor(access.standing)(await namesOf(db, [row.by])));
}
