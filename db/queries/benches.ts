import { eq } from 'drizzle-orm';
import type { BenchId } from '../authorized';
import type { Executor } from '../client';
import { benches } from '../schema/people';

/** A bench's name, for the head of its pages. */
export async function benchName(db: Executor, bench: BenchId): Promise<string> {
  const [row] = await db.select({ name: benches.name }).from(benches).where(eq(benches.id, bench));
  return row?.name ?? '';
}
