import { sql } from 'drizzle-orm';
import { boolean, index, int, json, mysqlTable, primaryKey, varchar } from 'drizzle-orm/mysql-core';
import { auditDetailSchema } from '@/lib/schemas/audit';
import { exactText, jsonColumn, moment, sha256Column, ulidColumn } from './columns';
import { benches, people } from './people';

/** Who did what, when, where: written in the same transaction as the change itself, never changed after. */
export const audit = mysqlTable('audit', {
  id: ulidColumn('id').primaryKey(),
  /** Null for acts outside any bench (sign-in, sign-out). */
  benchId: ulidColumn('bench_id').references(() => benches.id),
  circuitId: ulidColumn('circuit_id'),
  actorId: ulidColumn('actor_id').references(() => people.id),
  action: varchar('action', { length: 60 }).notNull(),
  detail: jsonColumn('detail', auditDetailSchema).notNull(),
  requestId: varchar('request_id', { length: 40 }).notNull(),
  at: moment('at').notNull().default(sql`current_timestamp(3)`),
}, (table) => [index('audit_bench').on(table.benchId, table.id), index('audit_circuit').on(table.circuitId, table.id)]);

/** First answers of writes that carried an idempotency key. Kept 24 h. */
export const idempotency = mysqlTable('idempotency', {
  personId: ulidColumn('person_id').notNull().references(() => people.id, { onDelete: 'cascade' }),
  key: exactText('key', { length: 100 }).notNull(),
  /** SHA-256 of method, path and body: the same key for another request is refused. */
  requestHash: sha256Column('request_hash').notNull(),
  /** Id kept for the thing that the request makes: a request taken up again makes the same thing, so that there is never a second one. */
  thingId: ulidColumn('thing_id'),
  /** False while the first request still runs, and when it was cut off. */
  done: boolean('done').notNull().default(false),
  status: int('status'),
  answer: json('answer').$type<Record<string, unknown>>(),
  createdAt: moment('created_at').notNull().default(sql`current_timestamp(3)`),
}, (table) => [primaryKey({ columns: [table.personId, table.key] }), index('idempotency_created').on(table.createdAt)]);
