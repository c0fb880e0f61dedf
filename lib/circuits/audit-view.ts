import { z } from 'zod';
import type { Database } from '@/db/client';
import { auditRows } from '@/db/queries/audit';
import { ownCircuits } from '@/db/queries/circuits';
import { namesOf } from '@/db/queries/names';
import type { Person } from '@/lib/access/caller';
import type { BenchAccess } from '@/lib/access/gates';
import { may } from '@/lib/access/may';
import { namingFor } from '@/lib/review/naming';
import type { AuditRow } from '@/lib/schemas/audit';
import type { Page, PageQuery } from '@/lib/schemas/page';
import { idSchema } from '@/lib/schemas/text';
import { decodeCursor, encodeCursor } from './cursor';

/** A page of the audit record, newest first: all of it for mentors and stewards, that of their own circuits for members. */
export async function auditPage(db: Database, access: BenchAccess, person: Person, query: PageQuery): Promise<Page<AuditRow>> {
  const circuits = may('see all of the audit record', access.standing) ? null : await ownCircuits(db, access.bench, person.id);
  const before = query.cursor === undefined ? undefined : decodeCursor(query.cursor, z.tuple([idSchema]))[0];
  const rows = await auditRows(db, access.bench, { before, limit: query.limit + 1, circuits });
  const shown = rows.slice(0, query.limit);
  const who = namingFor(access.standing)(await namesOf(db, shown.flatMap(({ actorId }) => actorId ?? [])));
  const last = shown.at(-1);
  return {
    items: shown.map(({ actorId, at, ...row }) => ({ ...row, at: at.toISOString(), by: actorId === null ? null : who(actorId) })),
    next: rows.length > shown.length && last ? encodeCursor([last.id]) : null,
  };
}
