import { endKey, indexOf } from '@/lib/document/geometry/sheet-index';
import type { Sheet, WireEnd } from '@/lib/document/records';

/** What a move takes along, by end: chosen parts and junctions, and junctions that hang on nothing else. */
export interface MovedSet {
  readonly parts: ReadonlySet<string>;
  readonly junctions: ReadonlySet<string>;
  has(end: WireEnd): boolean;
}

export function movedSet(sheet: Sheet, ids: ReadonlySet<string>): MovedSet {
  const index = indexOf(sheet);
  const parts = new Set(sheet.parts.filter((part) => ids.has(part.id)).map((part) => part.id));
  const junctions = new Set(sheet.junctions.filter((junction) => ids.has(junction.id)).map((junction) => junction.id));
  for (const wire of sheet.wires) {
    if (!ids.has(wire.id)) continue;
    for (const end of [wire.a, wire.b]) if (end.at === 'junction' && (index.wiresAt.get(endKey(end)) ?? []).every((other) => ids.has(other.id))) junctions.add(end.junction);
  }
  const has = (end: WireEnd) => (end.at === 'pin' ? parts.has(end.part) : junctions.has(end.junction));
  for (let grown = true; grown;) {
    grown = false;
    for (const junction of sheet.junctions) {
      if (junctions.has(junction.id)) continue;
      const wires = index.wiresAt.get(`junction:${junction.id}`) ?? [];
      const others = wires.map((wire) => (wire.a.at === 'junction' && wire.a.junction === junction.id ? wire.b : wire.a));
      if (others.length === 0 || !others.every(has)) continue;
      junctions.add(junction.id);
      grown = true;
    }
  }
  return { parts, junctions, has };
}
