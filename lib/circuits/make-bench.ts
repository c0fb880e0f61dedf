import { ulid } from 'ulid';
import { inTransaction } from '@/db/transaction';
import { isDuplicate } from '@/db/errors';
import { writeAudit } from '@/db/mutations/audit';
import { insertBench } from '@/db/mutations/benches';
import { benchRole } from '@/db/queries/people';
import { Problem } from '@/lib/errors/problem';
import { first, repeat, type Act, type Outcome } from '@/lib/review/act';
import type { Bench, NewBench } from '@/lib/schemas/bench';

/** A slug for a name: letters and digits of the Latin alphabet, words joined by hyphens. */
export function slugOf(name: string): string {
  const slug = name.normalize('NFKD').replace(/\p{M}/gu, '').toLowerCase().replace(/[^a-z0-9]+/g, '-').replace(/^-+|-+$/g, '').slice(0, 60).replace(/-+$/, '');
  return slug === '' ? 'bench' : slug;
}

/** Makes a bench; whoever makes it is its first steward. Throws `slug-taken`. */
export async function makeBench(act: Act, input: NewBench): Promise<Outcome<Bench>> {
  const bench = { id: act.thing ?? ulid(act.now.getTime()), slug: input.slug ?? slugOf(input.name), name: input.name };
  try {
    await inTransaction(act.db, async (tx) => {
      await insertBench(tx, bench, act.person.id);
      await writeAudit(tx, { bench: bench.id, actor: act.person.id, action: 'made the bench', detail: { name: bench.name }, requestId: act.requestId });
    });
  } catch (error) {
    if (!isDuplicate(error)) throw error;
    const own = await benchRole(act.db, bench.slug, act.person.id);
    if (own?.id === bench.id) return repeat(own);
    throw new Problem('slug-taken');
  }
  return first({ ...bench, role: 'steward' });
}
