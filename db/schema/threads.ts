import { boolean, index, mysqlEnum, mysqlTable, text } from 'drizzle-orm/mysql-core';
import { anchorSchema, threadStates } from '@/lib/schemas/thread';
import { circuits } from './circuits';
import { jsonColumn, moment, ulidColumn } from './columns';
import { people } from './people';
import { revisions } from './revisions';

export const threads = mysqlTable('threads', {
  id: ulidColumn('id').primaryKey(),
  circuitId: ulidColumn('circuit_id').notNull().references(() => circuits.id),
  anchor: jsonColumn('anchor', anchorSchema).notNull(),
  mustAnswer: boolean('must_answer').notNull(),
  status: mysqlEnum('status', threadStates).notNull(),
  openedBy: ulidColumn('opened_by').notNull().references(() => people.id),
  openedAt: moment('opened_at').notNull(),
  /** Newest revision at that moment. */
  revisionId: ulidColumn('revision_id').references(() => revisions.id),
  resolvedBy: ulidColumn('resolved_by').references(() => people.id),
  resolvedAt: moment('resolved_at'),
}, (table) => [index('threads_circuit').on(table.circuitId, table.status)]);

export const messages = mysqlTable('messages', {
  id: ulidColumn('id').primaryKey(),
  threadId: ulidColumn('thread_id').notNull().references(() => threads.id, { onDelete: 'cascade' }),
  by: ulidColumn('by_id').notNull().references(() => people.id),
  at: moment('at').notNull(),
  body: text('body').notNull(),
  editedAt: moment('edited_at'),
}, (table) => [index('messages_thread').on(table.threadId)]);
