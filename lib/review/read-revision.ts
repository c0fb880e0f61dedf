import { z } from 'zod';
import type { Database } from '@/db/client';
import { revisionsOf } from '@/db/queries/revisions';
import type { CircuitAccess } from '@/lib/access/gates';
import { Problem } from '@/lib/errors/problem';
import type { Page, PageQuery } from '@/lib/schemas/page';
import type { Revision } from '@/lib/schemas/revision';
import { namingFor } from './naming';
import { readReviewPicture, revisionViews } from './review-view';

/** One revision of the circuit as its reader sees it. */
export async function revisionView(db: Database, access: CircuitAccess, revisionId: string): Promise<Revision> {
  const picture = await readReviewPicture(db, [access.circuit]);
  const head = picture.revisions.find(({ id }) => id === revisionId);
  const [view] = head ? await revisionViews(db, picture, [head], namingFor(access.standing)) : [];
  if (!view) throw new Problem('not-found');
  return view;
}

/** A page of a circuit's revisions, newest first; the cursor is the number of the last one shown. */
export async function revisionPage(db: Database, access: CircuitAccess, query: PageQuery): Promise<Page<Revision>> {
  const before = query.cursor === undefined ? undefined : z.coerce.number().int().positive().safeParse(query.cursor);
  if (before?.success === false) throw new Problem('input-wrong', 'cursor: This is not a cursor from this list.');
  const rows = await revisionsOf(db, access.circuit, { ...(before ? { before: before.data } : {}), limit: query.limit + 1 });
  const shown = rows.slice(0, query.limit);
  const picture = await readReviewPicture(db, [access.circuit]);
  return {
    items: await revisionViews(db, picture, shown, namingFor(access.standing)),
    next: rows.length > shown.length ? String(shown.at(-1)?.number) : null,
  };
}
