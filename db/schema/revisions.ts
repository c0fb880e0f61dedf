import { sql } from 'drizzle-orm';
import { bigint, boolean, double, index, int, mysqlTable, primaryKey, text, uniqueIndex, varchar } from 'drizzle-orm/mysql-core';
import { z } from 'zod';
import { findingSchema } from '@/lib/netlist/findings/finding';
import { netlistSchema } from '@/lib/schemas/netlist';
import { circuits } from './circuits';
import { exactText, jsonColumn, letterColumn, longBlob, moment, sha256Column, ulidColumn } from './columns';
import { people } from './people';

const facts = z.record(z.string(), z.union([z.number(), z.string(), z.boolean(), z.tuple([z.number(), z.number()])]));
const strings = z.array(z.string());

/** An immutable cut of a sheet: a full copy of its own, independent of the update log. Its state is worked out, not stored. */
export const revisions = mysqlTable('revisions', {
  id: ulidColumn('id').primaryKey(),
  circuitId: ulidColumn('circuit_id').notNull().references(() => circuits.id),
  /** 1 for the first cut. */
  number: int('number', { unsigned: true }).notNull(),
  letter: letterColumn('letter').notNull(),
  seq: bigint('seq', { mode: 'number', unsigned: true }).notNull(),
  contentHash: sha256Column('content_hash').notNull(),
  presentationHash: sha256Column('presentation_hash').notNull(),
  netlist: jsonColumn('netlist', netlistSchema).notNull(),
  /** The whole sheet as one encoded Yjs update. */
  sheet: longBlob('sheet').notNull(),
  note: text('note').notNull(),
  cutBy: ulidColumn('cut_by').notNull().references(() => people.id),
  cutAt: moment('cut_at').notNull(),
  /** Rule versions and parameters in force at the cut. */
  rules: jsonColumn('rules', z.record(z.string(), z.object({ version: z.number(), parameters: z.record(z.string(), z.number()) }))).notNull(),
  /** Highest volts of each net by hold point, as the checks of the cut found them; null for cuts made before they were kept. */
  volts: jsonColumn('volts', z.record(z.string(), z.record(z.string(), z.number()))),
  askedAt: moment('asked_at'),
  askedBy: ulidColumn('asked_by').references(() => people.id),
}, (table) => [
  uniqueIndex('revisions_letter').on(table.circuitId, table.letter),
  uniqueIndex('revisions_seq').on(table.circuitId, table.seq),
]);

export const revisionParts = mysqlTable('revision_parts', {
  revisionId: ulidColumn('revision_id').notNull().references(() => revisions.id, { onDelete: 'cascade' }),
  partId: exactText('part_id', { length: 64 }).notNull(),
  ref: exactText('ref', { length: 40 }).notNull(),
  kind: varchar('kind', { length: 40 }).notNull(),
  facts: jsonColumn('facts', facts).notNull(),
}, (table) => [primaryKey({ columns: [table.revisionId, table.partId] }), index('revision_parts_ref').on(table.revisionId, table.ref)]);

export const revisionNets = mysqlTable('revision_nets', {
  revisionId: ulidColumn('revision_id').notNull().references(() => revisions.id, { onDelete: 'cascade' }),
  name: exactText('name', { length: 120 }).notNull(),
  givenNames: jsonColumn('given_names', strings).notNull(),
  facts: jsonColumn('facts', facts).notNull(),
}, (table) => [primaryKey({ columns: [table.revisionId, table.name] })]);

export const revisionPins = mysqlTable('revision_pins', {
  revisionId: ulidColumn('revision_id').notNull().references(() => revisions.id, { onDelete: 'cascade' }),
  partId: exactText('part_id', { length: 64 }).notNull(),
  pin: exactText('pin', { length: 20 }).notNull(),
  net: exactText('net', { length: 120 }).notNull(),
}, (table) => [primaryKey({ columns: [table.revisionId, table.partId, table.pin] }), index('revision_pins_net').on(table.revisionId, table.net)]);

/** The power-up plan as it stood at the cut. */
export const revisionHoldPoints = mysqlTable('revision_hold_points', {
  revisionId: ulidColumn('revision_id').notNull().references(() => revisions.id, { onDelete: 'cascade' }),
  position: int('position', { unsigned: true }).notNull(),
  name: exactText('name', { length: 120 }).notNull(),
  scenario: exactText('scenario', { length: 120 }),
  source: exactText('source', { length: 40 }),
  volts: double('volts').notNull(),
  amps: double('amps').notNull(),
  /** False when the plan does not say which source it raises: such a hold point cannot be signed. */
  sourceKnown: boolean('source_known').notNull(),
}, (table) => [primaryKey({ columns: [table.revisionId, table.position] }), uniqueIndex('revision_hold_points_name').on(table.revisionId, table.name)]);

/** Who made an electrical change before the cut, every maker past or present, whoever brought a deck: they may not sign. */
export const revisionContributors = mysqlTable('revision_contributors', {
  revisionId: ulidColumn('revision_id').notNull().references(() => revisions.id, { onDelete: 'cascade' }),
  personId: ulidColumn('person_id').notNull().references(() => people.id),
}, (table) => [primaryKey({ columns: [table.revisionId, table.personId] })]);

/** What the rules said at the cut, every outcome, in the collector's order. */
export const findings = mysqlTable('findings', {
  revisionId: ulidColumn('revision_id').notNull().references(() => revisions.id, { onDelete: 'cascade' }),
  position: int('position', { unsigned: true }).notNull(),
  fingerprint: exactText('fingerprint', { length: 128 }).notNull(),
  rule: varchar('rule', { length: 60 }).notNull(),
  outcome: varchar('outcome', { length: 20 }).notNull(),
  severity: varchar('severity', { length: 10 }).notNull(),
  refs: jsonColumn('refs', strings).notNull(),
  fromVolts: double('from_volts'),
  /** The finding as every call answers it. */
  finding: jsonColumn('finding', findingSchema).notNull(),
}, (table) => [primaryKey({ columns: [table.revisionId, table.position] }), index('findings_outcome').on(table.revisionId, table.outcome, table.severity)]);

export const revisionReviewers = mysqlTable('revision_reviewers', {
  revisionId: ulidColumn('revision_id').notNull().references(() => revisions.id, { onDelete: 'cascade' }),
  personId: ulidColumn('person_id').notNull().references(() => people.id),
  askedAt: moment('asked_at').notNull().default(sql`current_timestamp(3)`),
}, (table) => [primaryKey({ columns: [table.revisionId, table.personId] })]);
