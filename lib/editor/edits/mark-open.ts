import { pinDefinitionsOf } from '@/lib/document/geometry/kind-shape';
import type { Sheet } from '@/lib/document/records';
import { withParts } from './edit';

/** Marks a pin left open, or takes the mark away. */
export function markOpen(sheet: Sheet, partId: string, pin: string, open: boolean): Sheet {
  return withParts(sheet, (part) => {
    if (part.id !== partId || part.leftOpen.includes(pin) === open) return part;
    if (!pinDefinitionsOf(part).some((one) => one.name === pin)) return part;
    return { ...part, leftOpen: open ? [...part.leftOpen, pin].sort() : part.leftOpen.filter((other) => other !== pin) };
  });
}
