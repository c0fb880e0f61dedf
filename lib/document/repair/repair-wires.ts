import { pinDefinitionsOf } from '../geometry/kind-shape';
import type { JunctionRecord, PartRecord, WireEnd, WireRecord } from '../records';
import { endKey } from '../geometry/sheet-index';
import type { Repair, Repaired } from './repair';

/** Drops wires with a missing end, wires from an end to itself, second copies of a wire, then junctions without a wire. */
export function repairWires(
  parts: readonly PartRecord[], wires: readonly WireRecord[], junctions: readonly JunctionRecord[],
): { readonly wires: Repaired<WireRecord>; readonly junctions: Repaired<JunctionRecord> } {
  const pins = new Set(parts.flatMap((part) => pinDefinitionsOf(part).map((pin) => `pin:${part.id}:${pin.name}`)));
  const points = new Set(junctions.map((junction) => `junction:${junction.id}`));
  const there = (end: WireEnd) => (end.at === 'pin' ? pins : points).has(endKey(end));
  const seen = new Set<string>();
  const used = new Set<string>();
  const repairs: Repair[] = [];
  const kept = wires.filter((wire) => {
    const ends = [endKey(wire.a), endKey(wire.b)].sort();
    const twin = `${ends.join(' ')} ${JSON.stringify(wire.bends)}`;
    const reason = !there(wire.a) || !there(wire.b) ? 'an end is missing'
      : ends[0] === ends[1] ? 'both ends are the same'
      : seen.has(twin) ? 'a second copy of the same wire' : null;
    if (reason) {
      repairs.push({ collection: 'wires', id: wire.id, reason });
      return false;
    }
    seen.add(twin);
    ends.forEach((end) => used.add(end));
    return true;
  });
  const loose: Repair[] = [];
  const keptJunctions = junctions.filter((junction) => {
    if (used.has(`junction:${junction.id}`)) return true;
    loose.push({ collection: 'junctions', id: junction.id, reason: 'no wire ends here' });
    return false;
  });
  return { wires: { kept, repairs }, junctions: { kept: keptJunctions, repairs: loose } };
}
