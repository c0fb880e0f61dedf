import { kindOf } from '@/lib/netlist/kinds/kind-registry';
import type { PartRecord, Sheet } from '@/lib/document/records';
import type { Pose } from '@/lib/document/geometry/turn';
import { attachPins } from './attach-pins';
import { freeRef } from './designators';
import type { NewId } from './edit';
import { tidyWiring } from './tidy-wiring';

/** A part as it comes from the drawer: its kind's defaults, which count as assumed, and the next free designator. */
export function newPart(sheet: Sheet, kind: PartRecord['kind'], pose: Pose, id: string, facts: PartRecord['facts'] = {}): PartRecord {
  const defaults = kindOf(kind).defaults as PartRecord['facts'];
  const origins = Object.fromEntries(Object.keys(defaults).filter((key) => !(key in facts)).map((key) => [key, 'assumed' as const]));
  return { id, ref: freeRef(sheet, kind), kind, ...pose, facts: { ...defaults, ...facts }, origins, leftOpen: [] };
}

/** Puts a part on the sheet; its pins join what they are dropped on. */
export function addPart(sheet: Sheet, part: PartRecord, newId: NewId): Sheet {
  return attachPins(tidyWiring({ ...sheet, parts: [...sheet.parts, part] }), [part.id], newId);
}
