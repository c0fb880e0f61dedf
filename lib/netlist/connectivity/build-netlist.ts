import { byCodeUnit, compareDesignators } from '../designators/designator';
import type { Netlist, NetlistPart } from '../netlist';
import { drawnNets, type DrawnNets } from './drawn-nets';
import type { DrawnPart, NetlistSource } from './netlist-source';
import { pinNames } from './pin-names';
import { sortedByKey } from './sorted-by-key';

/** Marks: they shape nets or carry words, and are no parts of the netlist. */
const marks: ReadonlySet<string> = new Set(['zero-volt', 'earth', 'net-name', 'note']);

/**
 * The canonical netlist of a sheet. Pins joined by wires, by equal net names (case counts, outer space does not) or by 0 V marks
 * are one net; an earth mark makes its net `kind=earth` and not 0 V. The same sheet gives the same bytes, in whatever
 * order its parts and wires come.
 */
export function buildNetlist(source: NetlistSource): Netlist {
  const drawn = source.parts.filter((part) => !marks.has(part.kind)).sort(byDesignator);
  const nets = drawnNets(source, drawn);
  return {
    format: 1,
    title: source.title,
    parts: drawn.map((part) => netlistPart(part, nets)),
    nets: nets.list,
    models: [...source.models].sort((a, b) => byCodeUnit(a.name, b.name)),
    subcircuits: [...source.subcircuits].sort((a, b) => byCodeUnit(a.name, b.name)),
    scenarios: [...source.scenarios]
      .map((scenario) => ({ ...scenario, values: sortedByKey(scenario.values) }))
      .sort((a, b) => byCodeUnit(a.name, b.name)),
    holdPoints: [...source.holdPoints].sort((a, b) => a.volts - b.volts || byCodeUnit(a.name, b.name)),
  };
}

function byDesignator(a: DrawnPart, b: DrawnPart): number {
  return compareDesignators(a.ref, b.ref) || byCodeUnit(a.id, b.id);
}

function netlistPart(part: DrawnPart, nets: DrawnNets): NetlistPart {
  const pins = pinNames(part);
  return {
    id: part.id,
    ref: part.ref,
    kind: part.kind,
    pins: Object.fromEntries(pins.map((pin) => [pin, nets.nameOf(part.id, pin)])),
    facts: sortedByKey(part.facts),
    origins: sortedByKey(part.origins),
    ...(part.wave ? { wave: part.wave } : {}),
    ...(part.model === undefined ? {} : { model: part.model }),
    ...(part.params ? { params: sortedByKey(part.params) } : {}),
    leftOpen: pins.filter((pin) => part.leftOpen.includes(pin)),
  };
}
