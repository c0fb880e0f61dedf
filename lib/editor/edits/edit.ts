import type { PartRecord, Sheet } from '@/lib/document/records';

/** Makes the id of a new record; ULIDs in use, counted ones in tests. */
export type NewId = () => string;

/** Replaces the parts that `change` gives a new record for; the sheet itself when it changes none. */
export function withParts(sheet: Sheet, change: (part: PartRecord) => PartRecord): Sheet {
  let changed = false;
  const parts = sheet.parts.map((part) => {
    const next = change(part);
    changed ||= next !== part;
    return next;
  });
  return changed ? { ...sheet, parts } : sheet;
}
