import { buildNetlist } from '@/lib/netlist/connectivity/build-netlist';
import { contentHash, hashOf } from '@/lib/netlist/hash';
import type { Netlist } from '@/lib/netlist/netlist';
import type { Sheet } from '../records';
import { joinsOf } from './joins';

const cache = new WeakMap<Sheet, Map<string, Netlist>>();

/** The canonical netlist of a sheet; its plan and scenarios name their sources by designator. */
export function sheetToNetlist(sheet: Sheet, title: string = sheet.title): Netlist {
  const known = cache.get(sheet)?.get(title);
  if (known) return known;
  const refs = new Map(sheet.parts.map((part) => [part.id, part.ref]));
  const scenarioNames = new Map(sheet.scenarios.map((scenario) => [scenario.id, scenario.name]));
  const netlist = buildNetlist({
    title,
    parts: sheet.parts,
    joins: joinsOf(sheet),
    scenarios: sheet.scenarios.map(({ name, ambient, values }) => ({
      name, ambient,
      values: Object.fromEntries(Object.entries(values).map(([part, value]) => [refs.get(part) ?? part, value])),
    })),
    holdPoints: sheet.holdPoints.map(({ name, scenario, source, volts, amps }) => ({
      name, volts, amps,
      ...(scenario === undefined ? {} : { scenario: scenarioNames.get(scenario) ?? scenario }),
      ...(source === undefined ? {} : { source: refs.get(source) ?? source }),
    })),
    models: sheet.models,
    subcircuits: sheet.subcircuits,
  });
  cache.set(sheet, (cache.get(sheet) ?? new Map<string, Netlist>()).set(title, netlist));
  return netlist;
}

/** Content hash of a sheet's netlist: what sign-offs are bound to. */
export const contentHashOf = (sheet: Sheet): string => contentHash(sheetToNetlist(sheet));

/** Hash of all that is drawn, places and notes included: two sheets that look and read the same have the same one. */
export function presentationHash(sheet: Sheet): string {
  const byId = <T extends { readonly id: string }>(records: readonly T[]) => [...records].sort((a, b) => (a.id < b.id ? -1 : 1));
  return hashOf({
    parts: byId(sheet.parts), wires: byId(sheet.wires), junctions: byId(sheet.junctions),
    scenarios: byId(sheet.scenarios), holdPoints: byId(sheet.holdPoints), models: sheet.models, subcircuits: sheet.subcircuits,
  });
}

/** Whether the change from one sheet to another changes what the circuit is, as the content hash sees it. */
export const isElectrical = (before: Sheet, after: Sheet): boolean => before !== after && contentHashOf(before) !== contentHashOf(after);
