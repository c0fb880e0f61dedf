import type { KindId } from '../kinds/kind-id';
import type { Facts, Netlist, NetlistPart } from '../netlist';

/** A part for tests; its id is its designator. */
export function barePart(kind: KindId, ref: string, pins: Readonly<Record<string, string>>, facts: Facts = {}): NetlistPart {
  return { id: ref, ref, kind, pins, facts, origins: {}, leftOpen: [] };
}

/** A part with the pins 1 and 2. */
export function bareTwoPin(kind: KindId, ref: string, from: string, to: string, facts: Facts = {}): NetlistPart {
  return barePart(kind, ref, { 1: from, 2: to }, facts);
}

/** A netlist of parts alone, its nets those the parts name. */
export function bareNetlist(parts: readonly NetlistPart[], rest: Partial<Netlist> = {}): Netlist {
  const names = [...new Set(parts.flatMap((part) => Object.values(part.pins)))].sort();
  return {
    format: 1, title: 'Bare', parts, models: [], subcircuits: [], scenarios: [], holdPoints: [],
    nets: names.map((name) => ({ name, givenNames: [], pins: [], facts: {} })),
    ...rest,
  };
}
