import type { PersonId } from '@/db/authorized';
import type { Executor } from '@/db/client';
import { ownBenches, personById } from '@/db/queries/people';
import { Problem } from '@/lib/errors/problem';
import type { Who } from '@/lib/schemas/session';

/** Who a person is, and their benches with the role in each. */
export async function who(db: Executor, id: PersonId): Promise<Who> {
  const [person, benches] = await Promise.all([personById(db, id), ownBenches(db, id)]);
  if (!person) throw new Problem('not-signed-in');
  return { person, benches: benches.map(({ slug, name, role }) => ({ slug, name, role })) };
}
