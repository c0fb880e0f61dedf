import { nextDesignator } from '@/lib/netlist/designators/designator';
import { kindOf } from '@/lib/netlist/kinds/kind-registry';
import type { PartRecord, Sheet } from '@/lib/document/records';

/** Designator for a new part: the lowest free number of its class letter; '' for marks, which have none. */
export function freeRef(sheet: Pick<Sheet, 'parts'>, kind: PartRecord['kind'], alsoTaken: readonly string[] = []): string {
  const letter = kind === 'box' ? 'U' : kindOf(kind).letter;
  return letter === null ? '' : nextDesignator(letter, [...sheet.parts.map((part) => part.ref), ...alsoTaken]);
}

const form = /^[A-Za-z][A-Za-z0-9_]{0,39}$/;

/** Why a part cannot be called so; null when it can. Contacts of one plug share their designator. */
export function refusedRef(sheet: Sheet, part: PartRecord, ref: string): string | null {
  if (kindOf(part.kind).letter === null && part.kind !== 'box') return 'A mark has no designator.';
  if (!form.test(ref)) return 'A designator is a letter, then letters and digits, such as R12.';
  const other = sheet.parts.find((one) => one.id !== part.id && one.ref.toUpperCase() === ref.toUpperCase());
  if (!other || (other.kind === 'plug-contact' && part.kind === 'plug-contact')) return null;
  return `${other.ref} is taken. ${kindOf(part.kind).letter ? `The next free one is ${freeRef(sheet, part.kind)}.` : 'Choose another.'}`;
}
