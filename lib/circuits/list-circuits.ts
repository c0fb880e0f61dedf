import { z } from 'zod';
import type { Database } from '@/db/client';
import { circuitRows } from '@/db/queries/circuits';
import type { Person } from '@/lib/access/caller';
import type { BenchAccess } from '@/lib/access/gates';
import type { Circuit } from '@/lib/schemas/circuit';
import type { Page, PageQuery } from '@/lib/schemas/page';
import { idSchema } from '@/lib/schemas/text';
import { circuitViews } from './circuit-view';
import { decodeCursor, encodeCursor } from './cursor';

/** When the last one shown was changed, in ms of the Unix epoch up to the year 9999, and its id. */
const place = z.tuple([z.int().min(0).max(253_402_300_799_999), idSchema]);

/** A page of a bench's circuits, last changed first. */
export async function listBenchCircuits(db: Database, access: BenchAccess, person: Person, query: PageQuery & { archived?: 'yes' | undefined }): Promise<Page<Circuit>> {
  const at = query.cursor === undefined ? undefined : decodeCursor(query.cursor, place);
  const rows = await circuitRows(db, access.bench, {
    ...(at ? { after: { changedAt: new Date(at[0]), id: at[1] } } : {}), limit: query.limit + 1, archived: query.archived === 'yes',
  });
  const shown = rows.slice(0, query.limit);
  const last = shown.at(-1);
  return {
    items: await circuitViews(db, access.bench, shown, { id: person.id, role: access.standing.role }),
    next: rows.length > shown.length && last ? encodeCursor([last.changedAt.getTime(), last.id]) : null,
  };
}
