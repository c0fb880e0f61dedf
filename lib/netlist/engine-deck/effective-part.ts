import type { PartSetting } from '../kinds/kind-engine';
import type { Netlist, NetlistPart } from '../netlist';

/** By part id. Absent parts keep their own facts. */
export type PartSettings = Readonly<Record<string, PartSetting>>;

/** Parts of a run: what is lifted or at high impedance left out, a limit that the run sets or lifts in the part's facts. */
export function effectiveParts(netlist: Netlist, settings: PartSettings): readonly NetlistPart[] {
  return netlist.parts
    .filter((part) => settings[part.id]?.removed !== true)
    .map((part) => {
      const amps = settings[part.id]?.amps;
      if (amps === undefined) return part;
      const { ilim: _, ...facts } = part.facts;
      return { ...part, facts: amps === null ? facts : { ...facts, ilim: amps } };
    });
}
