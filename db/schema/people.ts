import { sql } from 'drizzle-orm';
import { index, int, mysqlEnum, mysqlTable, primaryKey, varchar } from 'drizzle-orm/mysql-core';
import { benchRoles } from '@/lib/schemas/bench';
import { moment, sha256Column, ulidColumn } from './columns';

const createdAt = () => moment('created_at').notNull().default(sql`current_timestamp(3)`);

export const people = mysqlTable('people', {
  id: ulidColumn('id').primaryKey(),
  /** Lower case. */
  email: varchar('email', { length: 254 }).notNull().unique(),
  name: varchar('name', { length: 120 }).notNull(),
  /** argon2id, PHC string. */
  passwordHash: varchar('password_hash', { length: 255 }).notNull(),
  createdAt: createdAt(),
});

/** Sessions as Lucia keeps them; the id is the SHA-256 of the cookie, so the table holds no usable value. */
export const sessions = mysqlTable('sessions', {
  id: sha256Column('id').primaryKey(),
  userId: ulidColumn('user_id').notNull().references(() => people.id, { onDelete: 'cascade' }),
  /** Idle limit; moved on by use. */
  expiresAt: moment('expires_at').notNull(),
  /** When the password was last given: acts that bind ask for ≤ 12 h. */
  signedInAt: moment('signed_in_at').notNull(),
  /** Absolute limit, whatever the use. */
  endsAt: moment('ends_at').notNull(),
  lastUsedAt: moment('last_used_at').notNull(),
  userAgent: varchar('user_agent', { length: 200 }).notNull().default(''),
}, (table) => [index('sessions_user').on(table.userId)]);

/** Growing delays after wrong passwords, by account and address together. */
export const signInDelays = mysqlTable('sign_in_delays', {
  /** SHA-256 of account and address. */
  id: sha256Column('id').primaryKey(),
  failures: int('failures', { unsigned: true }).notNull(),
  waitUntil: moment('wait_until').notNull(),
  lastAt: moment('last_at').notNull(),
}, (table) => [index('sign_in_delays_last').on(table.lastAt)]);

export const benches = mysqlTable('benches', {
  id: ulidColumn('id').primaryKey(),
  slug: varchar('slug', { length: 60 }).notNull().unique(),
  name: varchar('name', { length: 120 }).notNull(),
  createdAt: createdAt(),
});

/** One role for each person in a bench. */
export const memberships = mysqlTable('memberships', {
  benchId: ulidColumn('bench_id').notNull().references(() => benches.id, { onDelete: 'cascade' }),
  personId: ulidColumn('person_id').notNull().references(() => people.id, { onDelete: 'cascade' }),
  role: mysqlEnum('role', benchRoles).notNull(),
  /** Raised with every change of the role: part of the grant that open sockets are checked against. */
  version: int('version', { unsigned: true }).notNull().default(1),
  createdAt: createdAt(),
}, (table) => [primaryKey({ columns: [table.benchId, table.personId] }), index('memberships_person').on(table.personId)]);
