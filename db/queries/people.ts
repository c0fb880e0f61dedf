import { and, asc, eq, inArray } from 'drizzle-orm';
import type { BenchId, PersonId } from '../authorized';
import type { Executor } from '../client';
import { benches, memberships, people } from '../schema/people';

/** The account of an address, for signing in only. */
export async function accountByEmail(db: Executor, email: string) {
  const [row] = await db.select({ id: people.id, passwordHash: people.passwordHash }).from(people).where(eq(people.email, email));
  return row;
}

export async function personById(db: Executor, person: PersonId) {
  const [row] = await db.select({ id: people.id, name: people.name, email: people.email }).from(people).where(eq(people.id, person));
  return row;
}

export async function ownBenches(db: Executor, person: PersonId) {
  return db.select({ id: benches.id, slug: benches.slug, name: benches.name, role: memberships.role })
    .from(memberships).innerJoin(benches, eq(benches.id, memberships.benchId))
    .where(eq(memberships.personId, person)).orderBy(asc(benches.name));
}

/** A bench by slug with the person's role there; nothing when there is no such bench or no such membership. */
export async function benchRole(db: Executor, slug: string, personId: string) {
  const [row] = await db.select({ id: benches.id, slug: benches.slug, name: benches.name, role: memberships.role })
    .from(benches).innerJoin(memberships, eq(memberships.benchId, benches.id))
    .where(and(eq(benches.slug, slug), eq(memberships.personId, personId)));
  return row;
}

export async function benchMembers(db: Executor, bench: BenchId) {
  return db.select({ id: people.id, name: people.name, email: people.email, role: memberships.role, since: memberships.createdAt })
    .from(memberships).innerJoin(people, eq(people.id, memberships.personId))
    .where(eq(memberships.benchId, bench)).orderBy(asc(people.name), asc(people.id));
}

/** Which of `ids` are people of the bench, with their roles. */
export async function membersAmong(db: Executor, bench: BenchId, ids: readonly string[]) {
  if (ids.length === 0) return [];
  return db.select({ id: people.id, name: people.name, role: memberships.role })
    .from(memberships).innerJoin(people, eq(people.id, memberships.personId))
    .where(and(eq(memberships.benchId, bench), inArray(memberships.personId, [...ids])));
}

export async function countPeople(db: Executor): Promise<number> {
  return db.$count(people);
}

export async function peopleEmails(db: Executor): Promise<string[]> {
  return (await db.select({ email: people.email }).from(people)).map((row) => row.email);
}
