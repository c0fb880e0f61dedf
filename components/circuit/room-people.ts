import type { SheetSnapshot } from '@/realtime/client/sheet-session';
import type { PersonHere } from './people-on-sheet';

/** People on the sheet, each once: oneself first, whoever else has it open after. */
export function roomPeople(snapshot: SheetSnapshot | null): readonly PersonHere[] {
  if (!snapshot) return [];
  const all = [...(snapshot.self ? [snapshot.self] : []), ...snapshot.others];
  const seen = new Set<string>();
  return all.flatMap((entry) => {
    const key = entry.person ?? entry.connection;
    if (seen.has(key)) return [];
    seen.add(key);
    return [{ connection: entry.connection, name: entry.name, away: entry.fields === null }];
  });
}
