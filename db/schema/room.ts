import {
  bigint, boolean, index, int, mysqlTable, primaryKey, smallint, uniqueIndex, varchar,
} from 'drizzle-orm/mysql-core';
import { sql } from 'drizzle-orm';
import { exactText, mediumBlob, moment, sha256Column, ulidColumn } from './columns';

const seq = (name: string) => bigint(name, { mode: 'number', unsigned: true });
const createdAt = () => moment('created_at').notNull().default(sql`current_timestamp(3)`);

/** One row for each circuit's sheet. A circuit without it has no room: a document is never started empty by accident. */
export const rtRoom = mysqlTable('rt_room', {
  /** The circuit's id. */
  roomId: ulidColumn('room_id').primaryKey(),
  /** Seq of the newest committed update; 0 for a sheet nobody has touched. */
  headSeq: seq('head_seq').notNull().default(0),
  schemaVersion: int('schema_version', { unsigned: true }).notNull().default(1),
  /** Set when stored bytes failed their checksum or did not decode; nothing is appended until an operator clears it. */
  quarantinedAt: moment('quarantined_at'),
  quarantineReason: varchar('quarantine_reason', { length: 500 }),
  /** Set when the circuit is deleted for good; sockets close 4404. */
  tombstonedAt: moment('tombstoned_at'),
  createdAt: createdAt(),
});

/** The append-only log: one committed Yjs update a row, seq dense in its room from 1. */
export const rtUpdate = mysqlTable('rt_update', {
  roomId: ulidColumn('room_id').notNull(),
  seq: seq('seq').notNull(),
  /** The browser copy that sent it, or `key:…` for an edit over HTTP. */
  instanceId: exactText('instance_id', { length: 80 }).notNull(),
  clientSeq: seq('client_seq').notNull(),
  actorId: ulidColumn('actor_id').notNull(),
  /** Null for edits by personal access token and by the seed. */
  sessionId: exactText('session_id', { length: 64 }),
  /** True when the update changed the sheet's content hash. */
  electrical: boolean('electrical').notNull(),
  bytes: mediumBlob('bytes').notNull(),
  /** Over every column above, so that a flipped bit in any of them is seen at load. */
  sha256: sha256Column('sha256').notNull(),
  createdAt: createdAt(),
}, (table) => [
  primaryKey({ columns: [table.roomId, table.seq] }),
  uniqueIndex('rt_update_client').on(table.roomId, table.instanceId, table.clientSeq),
]);

/** The whole sheet at a seq, in parts under the packet limit. The two newest are kept. */
export const rtSnapshot = mysqlTable('rt_snapshot', {
  roomId: ulidColumn('room_id').notNull(),
  uptoSeq: seq('upto_seq').notNull(),
  part: smallint('part', { unsigned: true }).notNull(),
  parts: smallint('parts', { unsigned: true }).notNull(),
  bytes: mediumBlob('bytes').notNull(),
  sha256: sha256Column('sha256').notNull(),
  createdAt: createdAt(),
}, (table) => [primaryKey({ columns: [table.roomId, table.uptoSeq, table.part] })]);

/** How far each browser copy was committed when its rows were compacted away: a resend stays idempotent. */
export const rtInstance = mysqlTable('rt_instance', {
  roomId: ulidColumn('room_id').notNull(),
  instanceId: exactText('instance_id', { length: 80 }).notNull(),
  personId: ulidColumn('person_id').notNull(),
  lastClientSeq: seq('last_client_seq').notNull().default(0),
  /** Room seq of that last edit. */
  lastSeq: seq('last_seq').notNull().default(0),
  createdAt: createdAt(),
}, (table) => [primaryKey({ columns: [table.roomId, table.instanceId] })]);

/** Which person may write structs under a Yjs client id. Kept, since an offline copy may send them weeks later. */
export const rtClient = mysqlTable('rt_client', {
  roomId: ulidColumn('room_id').notNull(),
  clientId: bigint('client_id', { mode: 'number', unsigned: true }).notNull(),
  personId: ulidColumn('person_id').notNull(),
  createdAt: createdAt(),
}, (table) => [primaryKey({ columns: [table.roomId, table.clientId] })]);

/** Everyone who ever made an electrical change of the sheet; survives compaction of the log. */
export const rtContributor = mysqlTable('rt_contributor', {
  roomId: ulidColumn('room_id').notNull(),
  personId: ulidColumn('person_id').notNull(),
  firstSeq: seq('first_seq').notNull(),
  createdAt: createdAt(),
}, (table) => [primaryKey({ columns: [table.roomId, table.personId] })]);

/** Single-use right to open one room within 30 s. Exactly one of person and guest link is set. */
export const rtTicket = mysqlTable('rt_ticket', {
  /** SHA-256 of the token, hex; the token itself is shown once. */
  tokenHash: sha256Column('token_hash').primaryKey(),
  roomId: ulidColumn('room_id').notNull(),
  personId: ulidColumn('person_id'),
  sessionId: exactText('session_id', { length: 64 }),
  guestLinkId: ulidColumn('guest_link_id'),
  /** The grant as it stood at issue; another one at hello refuses the ticket. */
  grantVersion: varchar('grant_version', { length: 80 }).notNull(),
  expiresAt: moment('expires_at').notNull(),
  usedAt: moment('used_at'),
}, (table) => [index('rt_ticket_expiry').on(table.expiresAt)]);
