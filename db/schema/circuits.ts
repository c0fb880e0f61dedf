import { sql } from 'drizzle-orm';
import { bigint, double, index, int, mysqlTable, tinyint, uniqueIndex, varchar } from 'drizzle-orm/mysql-core';
import { moment, sha256Column, ulidColumn } from './columns';
import { benches, people } from './people';

const createdAt = () => moment('created_at').notNull().default(sql`current_timestamp(3)`);

/** The thing posted. Its live sheet is the room of the same id. */
export const circuits = mysqlTable('circuits', {
  id: ulidColumn('id').primaryKey(),
  benchId: ulidColumn('bench_id').notNull().references(() => benches.id),
  title: varchar('title', { length: 120 }).notNull(),
  /** The maker who posted it; stays a maker. */
  postedBy: ulidColumn('posted_by').notNull().references(() => people.id),
  archivedAt: moment('archived_at'),
  changedAt: moment('changed_at').notNull().default(sql`current_timestamp(3)`),
  createdAt: createdAt(),
}, (table) => [index('circuits_bench').on(table.benchId, table.changedAt)]);

/** Makers past and present: a row is ended, never deleted, because a past maker stays a contributor. */
export const circuitMakers = mysqlTable('circuit_makers', {
  id: ulidColumn('id').primaryKey(),
  circuitId: ulidColumn('circuit_id').notNull().references(() => circuits.id, { onDelete: 'cascade' }),
  personId: ulidColumn('person_id').notNull().references(() => people.id),
  /** 1 while in force, null once ended: makes a standing row unique. */
  standing: tinyint('standing'),
  since: moment('since').notNull().default(sql`current_timestamp(3)`),
  endedAt: moment('ended_at'),
}, (table) => [
  uniqueIndex('circuit_makers_standing').on(table.circuitId, table.personId, table.standing),
  index('circuit_makers_person').on(table.personId),
]);

/** What the server's own check of the live sheet last found: counts for lists, with the seq they belong to. */
export const circuitChecks = mysqlTable('circuit_checks', {
  circuitId: ulidColumn('circuit_id').primaryKey().references(() => circuits.id, { onDelete: 'cascade' }),
  seq: bigint('seq', { mode: 'number', unsigned: true }).notNull(),
  stops: int('stops', { unsigned: true }).notNull(),
  cautions: int('cautions', { unsigned: true }).notNull(),
  advices: int('advices', { unsigned: true }).notNull(),
  /** Lowest voltage that a stop blocks; 0 when it blocks whatever the voltage; null when none. */
  blockedAt: double('blocked_at'),
  /** Content hash of the sheet at `seq`. */
  contentHash: sha256Column('content_hash').notNull(),
  checkedAt: moment('checked_at').notNull(),
});

/** A guest's right to read one circuit. The token is shown once and stored as its SHA-256. */
export const guestLinks = mysqlTable('guest_links', {
  id: ulidColumn('id').primaryKey(),
  circuitId: ulidColumn('circuit_id').notNull().references(() => circuits.id, { onDelete: 'cascade' }),
  tokenHash: sha256Column('token_hash').notNull().unique(),
  madeBy: ulidColumn('made_by').notNull().references(() => people.id),
  /** True for the link behind the landing page's 'open this circuit'. */
  demo: tinyint('demo').notNull().default(0),
  expiresAt: moment('expires_at').notNull(),
  endedAt: moment('ended_at'),
  createdAt: createdAt(),
});
