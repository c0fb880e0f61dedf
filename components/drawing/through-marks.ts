import { indexOf } from '@/lib/document/geometry/sheet-index';
import type { Sheet } from '@/lib/document/records';

const cache = new WeakMap<Sheet, ReadonlySet<string>>();

/** Net names that a wire runs through: their words stand beside the line, without the stub of a name at a wire's end. */
export function throughMarks(sheet: Sheet): ReadonlySet<string> {
  const known = cache.get(sheet);
  if (known) return known;
  const { wiresAt } = indexOf(sheet);
  const marks = new Set(sheet.parts.filter((part) => part.kind === 'net-name' && (wiresAt.get(`pin:${part.id}:1`)?.length ?? 0) > 1).map((part) => part.id));
  cache.set(sheet, marks);
  return marks;
}
