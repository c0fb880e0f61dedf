import type { BenchRole } from '@/lib/schemas/bench';
import type { Transaction } from '../client';
import { benches, memberships, people } from '../schema/people';

/** A bench with its first steward: there is never one without. */
export async function insertBench(tx: Transaction, bench: { id: string; slug: string; name: string }, steward: string): Promise<void> {
  await tx.insert(benches).values(bench);
  await tx.insert(memberships).values({ benchId: bench.id, personId: steward, role: 'steward' });
}

export async function insertMember(tx: Transaction, benchId: string, personId: string, role: BenchRole): Promise<void> {
  await tx.insert(memberships).values({ benchId, personId, role });
}

export async function insertPerson(tx: Transaction, person: { id: string; email: string; name: string; passwordHash: string }): Promise<void> {
  await tx.insert(people).values(person);
}
