import { index, mysqlTable, text, tinyint, uniqueIndex } from 'drizzle-orm/mysql-core';
import { z } from 'zod';
import { circuits } from './circuits';
import { exactText, jsonColumn, moment, sha256Column, ulidColumn } from './columns';
import { people } from './people';
import { revisions } from './revisions';

/** A mentor's approval of one revision up to one hold point. Withdrawn, never deleted. */
export const signOffs = mysqlTable('sign_offs', {
  id: ulidColumn('id').primaryKey(),
  revisionId: ulidColumn('revision_id').notNull().references(() => revisions.id),
  holdPoint: exactText('hold_point', { length: 120 }).notNull(),
  /** The hash the signer sent, equal to the revision's. */
  contentHash: sha256Column('content_hash').notNull(),
  by: ulidColumn('by_id').notNull().references(() => people.id),
  at: moment('at').notNull(),
  until: moment('until').notNull(),
  conditions: text('conditions'),
  /** Fingerprints of undetermined stop rules at or below the hold point, as listed to the signer. */
  undetermined: jsonColumn('undetermined', z.array(z.string())).notNull(),
  /** 1 while standing, null once withdrawn: makes a standing sign-off unique. */
  standing: tinyint('standing'),
  withdrawnAt: moment('withdrawn_at'),
  withdrawnBy: ulidColumn('withdrawn_by').references(() => people.id),
  withdrawReason: text('withdraw_reason'),
}, (table) => [uniqueIndex('sign_offs_standing').on(table.revisionId, table.holdPoint, table.standing)]);

/** An 'ask for changes'. Sticky over later revisions until lifted by whoever asked, or overridden by a steward. */
export const objections = mysqlTable('objections', {
  id: ulidColumn('id').primaryKey(),
  circuitId: ulidColumn('circuit_id').notNull().references(() => circuits.id),
  revisionId: ulidColumn('revision_id').notNull().references(() => revisions.id),
  by: ulidColumn('by_id').notNull().references(() => people.id),
  at: moment('at').notNull(),
  reason: text('reason').notNull(),
  /** 1 while in force, null once lifted or overridden. */
  standing: tinyint('standing'),
  liftedAt: moment('lifted_at'),
  liftedBy: ulidColumn('lifted_by').references(() => people.id),
  /** Set when a steward overrode it; stays visible. */
  overrideReason: text('override_reason'),
}, (table) => [
  uniqueIndex('objections_standing').on(table.revisionId, table.by, table.standing),
  index('objections_circuit').on(table.circuitId, table.standing),
]);
