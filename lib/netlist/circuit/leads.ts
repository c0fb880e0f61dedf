import type { NetlistPart } from '../netlist';
import { isRemovable } from './part-nature';

/** Everything that comes off when one lead or plug is taken off. */
export interface LeadGroup {
  /** Designator of the lead or plug. */
  readonly name: string;
  readonly parts: readonly NetlistPart[];
}

/** Designator that a lead or contact comes off with: its plug's, else its own. */
export function leadName(part: NetlistPart): string {
  const of = part.facts.part_of;
  return typeof of === 'string' && of !== '' ? of : part.ref;
}

/** Removable leads and plug contacts by designator: contacts that share one are one plug and open together. */
export function findLeads(parts: readonly NetlistPart[]): readonly LeadGroup[] {
  const groups = new Map<string, NetlistPart[]>();
  for (const part of parts) {
    if (!isRemovable(part)) continue;
    const name = leadName(part);
    groups.set(name, [...(groups.get(name) ?? []), part]);
  }
  return [...groups].map(([name, members]) => ({ name, parts: members }));
}
