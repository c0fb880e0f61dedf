import type { Netlist, NetlistPart } from '@/lib/netlist/netlist';
import type { PartRecord, Sheet } from '../records';
import { emptySheet } from '../write-sheet';
import { areasLayout } from './areas-layout';
import { blocksOf } from './block';
import { feedsOf, potentialOf } from './potential';
import { wireUp } from './wire-up';

/** A netlist's part as a record of the sheet, not yet placed. */
export function recordOf(part: NetlistPart): PartRecord {
  return {
    id: part.id, ref: part.ref, kind: part.kind, x: 0, y: 0, turn: 0, mirror: false,
    facts: part.facts as PartRecord['facts'],
    origins: part.origins as PartRecord['origins'],
    leftOpen: [...part.leftOpen],
    ...(part.wave ? { wave: { shape: part.wave.shape, args: [...part.wave.args] } } : {}),
    ...(part.model === undefined ? {} : { model: part.model }),
    ...(part.params === undefined ? {} : { params: { ...part.params } }),
    ...(part.kind === 'box' ? { boxPins: Object.keys(part.pins) } : {}),
  };
}

/** Names for what placing makes: short, the same for the same deck. */
export function serialIds(prefix: string): (kind: string) => string {
  let count = 0;
  return (kind) => {
    count += 1;
    return `${prefix}-${kind}-${count}`;
  };
}

/** Supplies first and drives next, so that they come to stand on the left. */
function leftToRight(netlist: Netlist): readonly NetlistPart[] {
  const feeds = new Set(feedsOf(netlist).map((part) => part.id));
  const rank = (part: NetlistPart) => (feeds.has(part.id) ? 0 : part.kind === 'signal-generator' || part.kind === 'dc-source' ? 1 : 2);
  return [...netlist.parts].sort((a, b) => rank(a) - rank(b));
}

/**
 * A netlist drawn as a sheet: every part placed on the grid without overlap, joined by lines at right angles, 0 V symbols
 * and net names. The same netlist gives the same sheet. Plan and scenarios are left empty.
 */
export async function placeNetlist(netlist: Netlist, newId: (kind: string) => string = serialIds('deck')): Promise<Sheet> {
  const potential = potentialOf(netlist);
  const blocks = blocksOf(netlist, leftToRight(netlist), potential, recordOf);
  const places = await areasLayout(blocks, potential);
  const records = blocks.flatMap((block) => block.members.map(({ record }) => {
    const at = places.get(block.id) ?? { x: 0, y: 0 };
    return { ...record, x: record.x + at.x, y: record.y + at.y };
  }));
  const wired = wireUp(netlist, records, newId);
  return {
    ...emptySheet, title: netlist.title, parts: [...records, ...wired.marks], wires: wired.wires, junctions: wired.junctions,
    models: netlist.models, subcircuits: netlist.subcircuits,
  };
}
